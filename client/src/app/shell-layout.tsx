import { Outlet, ScrollRestoration } from 'react-router-dom';
import { useWords } from '../hooks/use-words';
import { leave } from './leave';
import { NewVersion } from './new-version';
import { ShellHeader } from './shell-header';
import { ShellTabs } from './shell-tabs';
import classes from './shell.module.css';

/** The frame of every page but the workbench, which brings its own header. */
export function ShellLayout() {
  const { say } = useWords();
  return (
    <div className={classes.shell}>
      <a className={classes.skip} href="#content">
        {say('app.skip')}
      </a>
      <ShellHeader />
      <NewVersion />
      <main id="content" className={classes.content} tabIndex={-1}>
        <Outlet context={{ leave }} />
      </main>
      <ShellTabs />
      <ScrollRestoration />
    </div>
  );
}

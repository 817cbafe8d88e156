import { IconBriefcase, IconDots } from '@tabler/icons-react';
import { NavLink } from 'react-router-dom';
import { useWords } from '../hooks/use-words';
import { paths } from '../lib/paths';
import classes from './shell.module.css';

/** The phone's places, within reach of a thumb. */
export function ShellTabs() {
  const { say } = useWords();
  return (
    <nav className={classes.tabs} aria-label={say('app.nav.label')}>
      <NavLink to={paths.jobs} className={classes.tab}>
        <IconBriefcase size={22} aria-hidden />
        {say('app.nav.jobs')}
      </NavLink>
      <NavLink to={paths.me} className={classes.tab}>
        <IconDots size={22} aria-hidden />
        {say('app.nav.more')}
      </NavLink>
    </nav>
  );
}

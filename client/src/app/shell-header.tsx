import { Menu } from '@mantine/core';
import { IconUserCircle } from '@tabler/icons-react';
import { Link, NavLink } from 'react-router-dom';
import { Mark } from '../components/mark';
import { ThemeSwitch } from '../components/theme-switch';
import { useWords } from '../hooks/use-words';
import { paths } from '../lib/paths';
import { useSession } from '../lib/session';
import { leave } from './leave';
import classes from './shell.module.css';

/** Desktop: mark, places, theme, person. The phone keeps the mark; its places stand at the bottom. */
export function ShellHeader() {
  const { say } = useWords();
  const me = useSession((session) => session.me);
  return (
    <header className={classes.header}>
      <Link to={paths.jobs} className={classes.brand}>
        <Mark />
        <span>{say('app.name')}</span>
      </Link>
      <nav className={classes.places} aria-label={say('app.nav.label')}>
        <NavLink to={paths.jobs} className={classes.place}>
          {say('app.nav.jobs')}
        </NavLink>
        <NavLink to={paths.company} className={classes.place}>
          {say('company.nav')}
        </NavLink>
      </nav>
      <span className={classes.shop}>{me?.company.name}</span>
      <div className={classes.themeSwitch}>
        <ThemeSwitch />
      </div>
      {me && (
        <div className={classes.person}>
          <Menu position="bottom-end" width={240}>
            <Menu.Target>
              <button
                type="button"
                className={classes.personButton}
                aria-label={say('auth.person.menu', { name: me.user.name, shop: me.company.name })}
              >
                <IconUserCircle size={20} aria-hidden />
                {me.user.name}
              </button>
            </Menu.Target>
            <Menu.Dropdown>
              <div className={classes.personCard}>
                <strong>{me.user.name}</strong>
                <span>{me.company.name}</span>
                <span>{say(`auth.role.${me.role}`)}</span>
              </div>
              <Menu.Divider />
              <Menu.Item component={Link} to={paths.me}>
                {say('auth.person.title')}
              </Menu.Item>
              <Menu.Item onClick={() => void leave()}>{say('auth.person.signOut')}</Menu.Item>
            </Menu.Dropdown>
          </Menu>
        </div>
      )}
    </header>
  );
}

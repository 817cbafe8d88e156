import { Button, NativeSelect } from '@mantine/core';
import { Link } from 'react-router-dom';
import { useTheme } from '../../../hooks/use-theme';
import { useWords } from '../../../hooks/use-words';
import { chooseDensity, chooseTheme, DENSITY_CHOICES, THEME_CHOICES } from '../../../lib/device';
import type { DensityChoice, ThemeChoice } from '../../../lib/device';
import { paths } from '../../../lib/paths';
import { useSession } from '../../../lib/session';
import classes from './auth.module.css';

const DENSITY_WORDS = {
  auto: 'auth.person.controlsAuto',
  office: 'auth.person.controlsOffice',
  field: 'auth.person.controlsField',
} as const;

/** Who is signed in, and what this device looks like for them. */
export function PersonPanel({ onSignOut }: { onSignOut: () => void }) {
  const { say } = useWords();
  const me = useSession((session) => session.me);
  const { choice, densityChoice } = useTheme();
  if (!me) return null;
  return (
    <div className={classes.person}>
      <h1 className={classes.personTitle}>{say('auth.person.title')}</h1>
      <dl className={classes.personFacts}>
        <dt>{say('auth.person.name')}</dt>
        <dd>{me.user.name}</dd>
        <dt>{say('auth.person.email')}</dt>
        <dd>{me.user.email}</dd>
        <dt>{say('auth.person.shop')}</dt>
        <dd>{me.company.name}</dd>
        <dt>{say('auth.person.role')}</dt>
        <dd>{say(`auth.role.${me.role}`)}</dd>
      </dl>
      <NativeSelect
        label={say('auth.person.theme')}
        data={THEME_CHOICES.map((value) => ({ value, label: say(`app.theme.${value}`) }))}
        value={choice}
        onChange={(event) => chooseTheme(event.currentTarget.value as ThemeChoice)}
      />
      <NativeSelect
        label={say('auth.person.controls')}
        data={DENSITY_CHOICES.map((value) => ({ value, label: say(DENSITY_WORDS[value]) }))}
        value={densityChoice}
        onChange={(event) => chooseDensity(event.currentTarget.value as DensityChoice)}
      />
      <Button variant="default" component={Link} to={paths.company}>
        {say('company.title')}
      </Button>
      <Button variant="default" onClick={onSignOut}>
        {say('auth.person.signOut')}
      </Button>
    </div>
  );
}

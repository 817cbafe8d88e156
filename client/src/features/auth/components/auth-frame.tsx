import { Text, Title } from '@mantine/core';
import type { ReactNode } from 'react';
import { Link, useLocation } from 'react-router-dom';
import { Mark } from '../../../components/mark';
import { ThemeSwitch } from '../../../components/theme-switch';
import { useWords } from '../../../hooks/use-words';
import { RunDrawing } from './run-drawing';
import classes from './auth.module.css';

interface AuthFrameProps {
  /** Four fields: on a phone the drawing makes room. */
  long?: boolean;
  title: string;
  other: { question: string; link: string; to: string };
  children: ReactNode;
}

/** The two pages before the door: a form, and the drawing this product is about. */
export function AuthFrame({ long, title, other, children }: AuthFrameProps) {
  const { say } = useWords();
  const { state } = useLocation();
  return (
    <div className={classes.frame} data-long={long || undefined}>
      <header className={classes.top}>
        <Mark height={24} />
        <span className={classes.name}>{say('app.name')}</span>
        <ThemeSwitch />
      </header>
      <aside className={classes.lead} aria-label={say('app.name')}>
        <p>{say('auth.lead')}</p>
        <RunDrawing />
      </aside>
      <main className={classes.card}>
        <Title order={1}>{title}</Title>
        {children}
        <Text className={classes.other}>
          {other.question}{' '}
          <Link to={other.to} state={state} className={classes.otherLink}>
            {other.link}
          </Link>
        </Text>
      </main>
    </div>
  );
}

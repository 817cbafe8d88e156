import { Button, Text } from '@mantine/core';
import { useEffect, useState } from 'react';
import { Mark } from '../../../components/mark';
import { useWords } from '../../../hooks/use-words';
import { openSession } from '../api/session-requests';
import classes from './auth.module.css';

/** Nobody waits long enough to read this on a good connection, so it says nothing before half a second. */
const QUIET_MILLISECONDS = 500;
const RETRY_MILLISECONDS = 5_000;

export function OpeningSession({ unreachable }: { unreachable: boolean }) {
  const { say } = useWords();
  const [speak, setSpeak] = useState(false);
  useEffect(() => {
    const timer = setTimeout(() => setSpeak(true), QUIET_MILLISECONDS);
    return () => clearTimeout(timer);
  }, []);
  useEffect(() => {
    if (!unreachable) return;
    const retry = () => void openSession();
    const timer = setInterval(retry, RETRY_MILLISECONDS);
    window.addEventListener('online', retry);
    return () => {
      clearInterval(timer);
      window.removeEventListener('online', retry);
    };
  }, [unreachable]);

  return (
    <main className={classes.opening}>
      <Mark height={28} />
      <Text role="status">
        {unreachable ? say('auth.session.unreachable') : speak ? say('auth.session.opening') : ''}
      </Text>
      {unreachable && (
        <Button onClick={() => void openSession()}>{say('auth.session.retry')}</Button>
      )}
    </main>
  );
}

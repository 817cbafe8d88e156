import { Button, Text, Title } from '@mantine/core';
import { useEffect } from 'react';
import { Link, useRouteError } from 'react-router-dom';
import { useWords } from '../hooks/use-words';
import { paths } from '../lib/paths';
import classes from './shell.module.css';

/** A page that broke: what happened, what is kept, what to do. The rest of the product stays up. */
export function RouteError() {
  const { say } = useWords();
  const error = useRouteError();
  useEffect(() => console.error(error), [error]);
  const missingCode = error instanceof TypeError && /import|module/i.test(error.message);
  return (
    <section className={classes.broken} role="alert">
      <Title order={1}>{say('app.error.pageTitle')}</Title>
      <Text>{missingCode ? say('app.error.pageNotLoaded') : say('app.error.pageText')}</Text>
      <div className={classes.brokenActions}>
        <Button variant="filled" onClick={() => window.location.reload()}>
          {say('app.reload')}
        </Button>
        <Button component={Link} to={paths.jobs}>
          {say('app.toJobs')}
        </Button>
      </div>
    </section>
  );
}

import { Button } from '@mantine/core';
import { Link } from 'react-router-dom';
import { EmptyPanel } from '../components/empty-panel';
import { useWords } from '../hooks/use-words';
import { usePageTitle } from '../hooks/use-page-title';
import { paths } from '../lib/paths';

export default function NotFoundPage() {
  const { say } = useWords();
  usePageTitle(say('app.notFound.title'));
  return (
    <main>
      <h1>{say('app.notFound.title')}</h1>
      <EmptyPanel words={say('app.notFound.text')}>
        <Button component={Link} to={paths.jobs}>
          {say('app.toJobs')}
        </Button>
      </EmptyPanel>
    </main>
  );
}

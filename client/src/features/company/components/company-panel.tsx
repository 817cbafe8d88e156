import { useQuery } from '@tanstack/react-query';
import { ListSkeleton } from '../../../components/list-skeleton';
import { LoadFailure } from '../../../components/load-failure';
import { useWords } from '../../../hooks/use-words';
import { companyQuery } from '../api/company-queries';
import { SettingsForm } from './settings-form';
import classes from './company.module.css';

/** What the whole shop goes by. */
export function CompanyPanel() {
  const { say } = useWords();
  const { data: company, error, isPending, refetch } = useQuery(companyQuery());
  return (
    <div className={classes.page}>
      <h1 className={classes.title}>{say('company.title')}</h1>
      {isPending && <ListSkeleton rows={6} rowHeight="3.5rem" />}
      {!company && error && (
        <LoadFailure
          message={say('company.failure.load')}
          error={error}
          onRetry={() => void refetch()}
        />
      )}
      {company && <SettingsForm key={company.version} company={company} />}
    </div>
  );
}

import { Button } from '@mantine/core';
import { JOB_SORTS, JOB_STATUSES } from '@fairlead/shared';
import type { JobStatus } from '@fairlead/shared';
import { useInfiniteQuery, useMutation, useQueryClient } from '@tanstack/react-query';
import { useState } from 'react';
import { useNavigate } from 'react-router-dom';
import { DialogFrame } from '../../../components/dialog-frame';
import { EmptyPanel } from '../../../components/empty-panel';
import { ListControls } from '../../../components/list-controls';
import { ListSkeleton } from '../../../components/list-skeleton';
import { LoadFailure } from '../../../components/load-failure';
import { useListParams } from '../../../hooks/use-list-params';
import { useWords } from '../../../hooks/use-words';
import { paths } from '../../../lib/paths';
import { useSession } from '../../../lib/session';
import { createJobMutation } from '../api/job-mutations';
import { jobListQuery } from '../api/job-queries';
import { JobForm } from './job-form';
import { JobsList } from './jobs-list';
import classes from './jobs.module.css';

const DEFAULT_SORT = '-updatedAt';
const DESCENDING = new Set(['updatedAt', 'dueDate']);

/** The shop's jobs. */
export function JobsPanel() {
  const { say } = useWords();
  const navigate = useNavigate();
  const mayCreate = useSession(({ me }) => me?.can.createJobs ?? false);
  const { values, set } = useListParams({
    sorts: JOB_SORTS,
    defaultSort: DEFAULT_SORT,
    statuses: JOB_STATUSES,
  });
  const list = useInfiniteQuery(
    jobListQuery({ ...values, status: values.status as JobStatus | '' }),
  );
  const create = useMutation(createJobMutation(useQueryClient()));
  const [isOpen, setOpen] = useState(false);
  const jobs = list.data?.pages.flatMap(({ items }) => items) ?? [];
  const isNarrowed = values.search !== '' || values.status !== '';
  const newJob = mayCreate && (
    <Button variant="filled" onClick={() => setOpen(true)}>
      {say('jobs.newJob')}
    </Button>
  );
  return (
    <div className={classes.page}>
      <div className={classes.head}>
        <h1 className={classes.title}>{say('jobs.title')}</h1>
        <div className={classes.deskOnly}>{newJob}</div>
      </div>
      <ListControls
        values={values}
        onChange={set}
        search={{ label: say('jobs.search'), hint: say('jobs.searchHint') }}
        filter={{
          label: say('jobs.status.label'),
          choices: [
            { value: '', label: say('jobs.status.all') },
            ...JOB_STATUSES.map((value) => ({ value, label: say(`jobs.status.${value}`) })),
          ],
        }}
        sort={{
          label: say('jobs.sort.label'),
          choices: JOB_SORTS.map((value) => ({
            value: DESCENDING.has(value) ? `-${value}` : value,
            label: say(`jobs.sort.${value}`),
          })),
        }}
      />
      {list.isPending && <ListSkeleton rows={6} rowHeight="3.25rem" />}
      {list.isError && (
        <LoadFailure
          message={say('jobs.failure.load')}
          error={list.error}
          onRetry={() => void list.refetch()}
        />
      )}
      {list.isSuccess && jobs.length === 0 && (
        <EmptyPanel words={emptyWords()}>
          {isNarrowed && (
            <Button variant="default" onClick={() => set({ search: '', status: '' })}>
              {say('jobs.showAll')}
            </Button>
          )}
        </EmptyPanel>
      )}
      {jobs.length > 0 && <JobsList jobs={jobs} />}
      {list.hasNextPage && (
        <Button
          variant="default"
          loading={list.isFetchingNextPage}
          onClick={() => void list.fetchNextPage()}
        >
          {say('jobs.loadMore')}
        </Button>
      )}
      {mayCreate && <div className={classes.foot}>{newJob}</div>}
      <DialogFrame
        isOpen={isOpen}
        title={say('jobs.form.new')}
        size="md"
        onClose={() => setOpen(false)}
      >
        <JobForm
          onCancel={() => setOpen(false)}
          send={async (body, attempt) => {
            await create.mutateAsync({ attempt, body });
            void navigate(paths.job(attempt.id));
          }}
        />
      </DialogFrame>
    </div>
  );

  function emptyWords(): string {
    if (values.search !== '') return say('jobs.nothingNamed', { text: values.search });
    if (values.status !== '') return say('jobs.nothingLike');
    return say(mayCreate ? 'jobs.empty' : 'jobs.emptyReader');
  }
}

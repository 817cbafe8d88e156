import { Button } from '@mantine/core';
import { JOB_SORTS, JOB_STATUSES } from '@fairlead/shared';
import type { JobStatus } from '@fairlead/shared';
import { useInfiniteQuery, useMutation, useQueryClient } from '@tanstack/react-query';
import { useState } from 'react';
import { useNavigate } from 'react-router-dom';
import { DialogFrame } from '../../../components/dialog-frame';
import { ListControls } from '../../../components/list-controls';
import { ListResult } from '../../../components/list-result';
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
      <ListResult
        list={list}
        failure={say('jobs.failure.load')}
        empty={emptyWords()}
        onShowAll={isNarrowed ? () => set({ search: '', status: '' }) : null}
      >
        {(jobs) => <JobsList jobs={jobs} />}
      </ListResult>
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

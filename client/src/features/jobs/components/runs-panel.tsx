import { Button } from '@mantine/core';
import { RUN_SORTS } from '@fairlead/shared';
import type { Job, RunDocument, RunListItem, Status } from '@fairlead/shared';
import { useInfiniteQuery, useMutation, useQueryClient } from '@tanstack/react-query';
import { useState } from 'react';
import { useNavigate } from 'react-router-dom';
import { DialogFrame } from '../../../components/dialog-frame';
import { ListControls } from '../../../components/list-controls';
import { ListResult } from '../../../components/list-result';
import { useListParams } from '../../../hooks/use-list-params';
import type { Attempt } from '../../../hooks/use-send-form';
import { useWords } from '../../../hooks/use-words';
import { paths } from '../../../lib/paths';
import { showToast } from '../../../lib/toasts';
import { createRunMutation, deleteRunMutation, restoreRunMutation } from '../api/run-mutations';
import { runListQuery } from '../api/run-queries';
import { LayOutRunForm } from './lay-out-run-form';
import { RunsList } from './runs-list';
import classes from './jobs.module.css';

const FILTERS = ['over', 'watch', 'no-answer', 'ok'] as const satisfies Status[];
/** A tag reads upward; everything else is asked for largest, latest or worst first. */
const sortValue = (sort: string) => (sort === 'tag' ? sort : `-${sort}`);

/** The runs of one job. */
export function RunsPanel({ job }: { job: Job }) {
  const { say } = useWords();
  const client = useQueryClient();
  const navigate = useNavigate();
  const [isOpen, setOpen] = useState(false);
  const { values, set } = useListParams({
    sorts: RUN_SORTS,
    defaultSort: 'tag',
    statuses: FILTERS,
  });
  const list = useInfiniteQuery(
    runListQuery(job.id, { ...values, status: values.status as Status | '' }),
  );
  const create = useMutation(createRunMutation(client, job.id));
  const restore = useMutation(restoreRunMutation(client, job.id));
  const remove = useMutation(deleteRunMutation(client, job.id));
  const isNarrowed = values.search !== '' || values.status !== '';
  const layOut = job.can.createRuns && (
    <Button variant="filled" onClick={() => setOpen(true)}>
      {say('jobs.runs.layOut')}
    </Button>
  );

  const bringBack = (run: RunListItem) =>
    restore.mutate(run.id, {
      onError: () => void showToast(say('jobs.failure.restore', { name: run.tag })),
    });
  const deleteRun = (run: RunListItem) =>
    remove.mutate(run.id, {
      onSuccess: () =>
        void showToast(say('jobs.deleted', { name: run.tag }), {
          label: say('jobs.undo'),
          run: () => bringBack(run),
        }),
      onError: () => void showToast(say('jobs.failure.delete', { name: run.tag })),
    });
  const send = async (document: RunDocument, attempt: Attempt) => {
    await create.mutateAsync({ attempt, document });
    void navigate(paths.run(job.id, attempt.id));
  };
  return (
    <section className={classes.page} aria-label={say('jobs.runs.title')}>
      <div className={classes.head}>
        <h2 className={classes.title}>{say('jobs.runs.title')}</h2>
        <div className={classes.deskOnly}>{layOut}</div>
      </div>
      <ListControls
        values={values}
        onChange={set}
        search={{ label: say('jobs.runs.search'), hint: say('jobs.runs.searchHint') }}
        filter={{
          label: say('jobs.runs.filter.label'),
          choices: [
            { value: '', label: say('jobs.runs.filter.all') },
            ...FILTERS.map((value) => ({ value, label: say(`app.status.${value}`) })),
          ],
        }}
        sort={{
          label: say('jobs.runs.sort.label'),
          choices: RUN_SORTS.map((sort) => ({
            value: sortValue(sort),
            label: say(`jobs.runs.sort.${sort}`),
          })),
        }}
      />
      <ListResult
        list={list}
        failure={say('jobs.failure.loadRuns')}
        empty={emptyWords()}
        onShowAll={isNarrowed ? () => set({ search: '', status: '' }) : null}
      >
        {(runs) => <RunsList runs={runs} onDelete={deleteRun} />}
      </ListResult>
      {job.can.createRuns && <div className={classes.foot}>{layOut}</div>}
      <DialogFrame
        isOpen={isOpen}
        title={say('jobs.runs.new.title')}
        size="md"
        onClose={() => setOpen(false)}
      >
        <LayOutRunForm send={send} onCancel={() => setOpen(false)} />
      </DialogFrame>
    </section>
  );

  function emptyWords(): string {
    if (values.search !== '') return say('jobs.nothingNamed', { text: values.search });
    if (values.status !== '') return say('jobs.runs.nothingLike');
    return say(job.can.createRuns ? 'jobs.runs.empty' : 'jobs.runs.emptyReader');
  }
}

import { Button } from '@mantine/core';
import type { Job } from '@fairlead/shared';
import { useMutation, useQueryClient } from '@tanstack/react-query';
import { useState } from 'react';
import { Link, useNavigate } from 'react-router-dom';
import { DialogFrame } from '../../../components/dialog-frame';
import { useWords } from '../../../hooks/use-words';
import { formatDay } from '../../../lib/format-date';
import { paths } from '../../../lib/paths';
import { showToast } from '../../../lib/toasts';
import { deleteJobMutation, restoreJobMutation, updateJobMutation } from '../api/job-mutations';
import { JobForm } from './job-form';
import classes from './jobs.module.css';

/** What the job is, and changing or deleting it. */
export function JobHead({ job }: { job: Job }) {
  const { say } = useWords();
  const client = useQueryClient();
  const navigate = useNavigate();
  const [isOpen, setOpen] = useState(false);
  const update = useMutation(updateJobMutation(client, job.id));
  const restore = useMutation(restoreJobMutation(client));
  const remove = useMutation({
    ...deleteJobMutation(client),
    onError: () => void showToast(say('jobs.failure.delete', { name: job.name })),
  });

  const bringBack = async () => {
    try {
      await restore.mutateAsync(job.id);
      showToast(say('jobs.restored', { name: job.name }));
    } catch {
      showToast(say('jobs.failure.restore', { name: job.name }));
    }
  };
  const deleteJob = async () => {
    await remove.mutateAsync(job.id);
    void navigate(paths.jobs);
    showToast(say('jobs.deleted', { name: job.name }), {
      label: say('jobs.undo'),
      run: () => void bringBack(),
    });
  };
  return (
    <>
      <div className={classes.head}>
        <div>
          <p className={classes.sub}>
            <Link className={classes.link} to={paths.jobs}>
              {say('jobs.title')}
            </Link>
            {` / ${job.number}`}
          </p>
          <h1 className={classes.title}>{job.name}</h1>
        </div>
        <div className={classes.acts}>
          {job.can.update && (
            <Button variant="default" onClick={() => setOpen(true)}>
              {say('jobs.edit')}
            </Button>
          )}
          {job.can.delete && (
            <Button variant="subtle" onClick={() => void deleteJob()}>
              {say('jobs.delete')}
            </Button>
          )}
        </div>
      </div>
      <dl className={classes.details}>
        <div>
          <dt>{say('jobs.details.status')}</dt>
          <dd>{say(`jobs.status.${job.status}`)}</dd>
        </div>
        <div>
          <dt>{say('jobs.details.dueDate')}</dt>
          <dd>{job.dueDate ? formatDay(job.dueDate) : say('jobs.noDue')}</dd>
        </div>
        <div>
          <dt>{say('jobs.details.address')}</dt>
          <dd>{job.address || say('jobs.details.noAddress')}</dd>
        </div>
      </dl>
      <DialogFrame
        isOpen={isOpen}
        title={say('jobs.form.edit')}
        size="md"
        onClose={() => setOpen(false)}
      >
        <JobForm
          job={job}
          onCancel={() => setOpen(false)}
          send={async (body, attempt, baseVersion) => {
            await update.mutateAsync({ attempt, body: { ...body, baseVersion } });
            setOpen(false);
          }}
        />
      </DialogFrame>
    </>
  );
}

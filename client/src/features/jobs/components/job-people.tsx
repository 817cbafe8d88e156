import { ActionIcon, NativeSelect } from '@mantine/core';
import type { Job, Person } from '@fairlead/shared';
import { IconX } from '@tabler/icons-react';
import { useMutation, useQuery, useQueryClient } from '@tanstack/react-query';
import { LoadFailure } from '../../../components/load-failure';
import { useWords } from '../../../hooks/use-words';
import { showToast } from '../../../lib/toasts';
import { personOnJobMutation } from '../api/job-mutations';
import { peopleQuery } from '../api/job-queries';
import classes from './jobs.module.css';

/** Who is on the job; whoever may assign people puts them on and takes them off. */
export function JobPeople({ job }: { job: Job }) {
  const { say } = useWords();
  const client = useQueryClient();
  const mayAssign = job.can.assignPeople;
  const everyone = useQuery({ ...peopleQuery(), enabled: mayAssign });
  const change = useMutation({
    ...personOnJobMutation(client, job.id),
    onError: () => void showToast(say('jobs.failure.person')),
  });
  const others = (everyone.data ?? []).filter(
    ({ id }) => !job.people.some((person) => person.id === id),
  );

  const takeOff = (person: Person) => {
    change.mutate({ person, on: false });
    showToast(say('jobs.people.removed', { name: person.name }), {
      label: say('jobs.people.undoRemove'),
      run: () => change.mutate({ person, on: true }),
    });
  };
  return (
    <section className={classes.people} aria-label={say('jobs.people.title')}>
      <strong>{say('jobs.people.title')}</strong>
      {job.people.length === 0 && <span className={classes.small}>{say('jobs.people.none')}</span>}
      {job.people.map((person) => (
        <div key={person.id} className={classes.person}>
          <span>
            {person.name}
            <span className={classes.small}>{say(`auth.role.${person.role}`)}</span>
          </span>
          {mayAssign && (
            <ActionIcon
              variant="subtle"
              aria-label={say('jobs.people.remove', { name: person.name })}
              onClick={() => takeOff(person)}
            >
              <IconX size={18} />
            </ActionIcon>
          )}
        </div>
      ))}
      {mayAssign && others.length > 0 && (
        <NativeSelect
          aria-label={say('jobs.people.add')}
          value=""
          data={[
            { value: '', label: say('jobs.people.pick') },
            ...others.map(({ id, name }) => ({ value: id, label: name })),
          ]}
          onChange={(event) => {
            const person = others.find(({ id }) => id === event.currentTarget.value);
            if (person) change.mutate({ person, on: true });
          }}
        />
      )}
      {everyone.isSuccess && others.length === 0 && (
        <span className={classes.small}>{say('jobs.people.everyone')}</span>
      )}
      {everyone.isError && (
        <LoadFailure
          message={say('jobs.failure.loadPeople')}
          error={everyone.error}
          onRetry={() => void everyone.refetch()}
        />
      )}
    </section>
  );
}

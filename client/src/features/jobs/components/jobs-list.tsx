import type { Job } from '@fairlead/shared';
import { Link } from 'react-router-dom';
import { useNarrow } from '../../../hooks/use-narrow';
import { useWords } from '../../../hooks/use-words';
import type { Say } from '../../../hooks/use-words';
import { formatDay, formatMoment } from '../../../lib/format-date';
import { paths } from '../../../lib/paths';
import classes from './jobs.module.css';

/** More names than this wait behind "and 3 more". */
const SHOWN_PEOPLE = 2;

export function peopleText(people: Job['people'], say: Say): string {
  if (people.length === 0) return say('jobs.noPeople');
  const names = people
    .slice(0, SHOWN_PEOPLE)
    .map(({ name }) => name)
    .join(', ');
  const count = people.length - SHOWN_PEOPLE;
  return count > 0 ? say('jobs.morePeople', { names, count }) : names;
}

/** The jobs: a table, or cards on a phone. */
export function JobsList({ jobs }: { jobs: Job[] }) {
  return useNarrow() ? <JobCards jobs={jobs} /> : <JobsTable jobs={jobs} />;
}

function JobsTable({ jobs }: { jobs: Job[] }) {
  const { say } = useWords();
  return (
    <div className={classes.tableBox}>
      <table className={classes.table}>
        <thead>
          <tr>
            <th scope="col">{say('jobs.column.number')}</th>
            <th scope="col">{say('jobs.column.name')}</th>
            <th scope="col">{say('jobs.column.status')}</th>
            <th scope="col">{say('jobs.column.dueDate')}</th>
            <th scope="col" className={classes.right}>
              {say('jobs.column.runs')}
            </th>
            <th scope="col">{say('jobs.column.people')}</th>
            <th scope="col">{say('jobs.column.updated')}</th>
          </tr>
        </thead>
        <tbody>
          {jobs.map((job) => (
            <tr key={job.id}>
              <td>{job.number}</td>
              <td className={classes.name}>
                <Link className={classes.link} to={paths.job(job.id)}>
                  {job.name}
                </Link>
                {job.address && <span className={classes.small}>{job.address}</span>}
              </td>
              <td>{say(`jobs.status.${job.status}`)}</td>
              <td>{job.dueDate ? formatDay(job.dueDate) : say('jobs.noDue')}</td>
              <td className={`${classes.right} num`}>{job.runCount}</td>
              <td>{peopleText(job.people, say)}</td>
              <td>{formatMoment(job.updatedAt)}</td>
            </tr>
          ))}
        </tbody>
      </table>
    </div>
  );
}

function JobCards({ jobs }: { jobs: Job[] }) {
  const { say } = useWords();
  return (
    <ul className={classes.cards}>
      {jobs.map((job) => (
        <li key={job.id} className={classes.card}>
          <Link className={classes.cardLink} to={paths.job(job.id)}>
            {job.name}
          </Link>
          <span className={classes.small}>
            {[
              job.number,
              say(`jobs.status.${job.status}`),
              say('jobs.runCount', { count: job.runCount }),
              job.dueDate ? say('jobs.due', { date: formatDay(job.dueDate) }) : '',
            ]
              .filter(Boolean)
              .join(' · ')}
          </span>
          <span className={classes.small}>{peopleText(job.people, say)}</span>
        </li>
      ))}
    </ul>
  );
}

import { ActionIcon } from '@mantine/core';
import { formatAngle, formatLength, formatPercent } from '@fairlead/shared';
import type { RunListItem } from '@fairlead/shared';
import { IconTrash } from '@tabler/icons-react';
import { Link } from 'react-router-dom';
import { CompactStrip } from '../../../components/drawing/compact-strip';
import { StatusGlyph } from '../../../components/drawing/status-glyph';
import { useNarrow } from '../../../hooks/use-narrow';
import { useWords } from '../../../hooks/use-words';
import type { Say } from '../../../hooks/use-words';
import { formatMoment } from '../../../lib/format-date';
import { paths } from '../../../lib/paths';
import classes from './jobs.module.css';

interface RunsListProps {
  runs: RunListItem[];
  onDelete: (run: RunListItem) => void;
}

const STRIP_WIDTH = 260;
const CARD_STRIP_WIDTH = 320;

/** A job's runs: a table, or cards on a phone. */
export function RunsList(props: RunsListProps) {
  return useNarrow() ? <RunCards {...props} /> : <RunsTable {...props} />;
}

function fromTo({ summary }: RunListItem, say: Say): string {
  const open = say('jobs.runs.openEnd');
  return say('jobs.runs.fromTo', { from: summary.from || open, to: summary.to || open });
}

function figures({ summary }: RunListItem, say: Say) {
  return {
    raceway: `${summary.tradeSize ?? ''} ${summary.racewayType}`.trim(),
    degrees: formatAngle(summary.worstSectionDegrees),
    fill:
      summary.fillPercent === null ? say('jobs.runs.noFill') : formatPercent(summary.fillPercent),
    length:
      summary.lengthInches === null
        ? say('jobs.runs.noLength')
        : formatLength(summary.lengthInches, { to: 1 }),
  };
}

function Result({ run }: { run: RunListItem }) {
  const { say } = useWords();
  return (
    <span className={classes.status} data-status={run.summary.status}>
      <StatusGlyph status={run.summary.status} size={20} />
      {say(`app.status.${run.summary.status}`)}
    </span>
  );
}

function Revision({ run }: { run: RunListItem }) {
  const { say } = useWords();
  const state = say(`jobs.runs.state.${run.revision.state}`);
  return <>{say('jobs.runs.revision', { letter: run.revision.letter, state })}</>;
}

function DeleteRun({ run, onDelete }: { run: RunListItem; onDelete: RunsListProps['onDelete'] }) {
  const { say } = useWords();
  if (!run.can.delete) return null;
  return (
    <ActionIcon
      variant="subtle"
      aria-label={say('jobs.deleteNamed', { name: run.tag })}
      onClick={() => onDelete(run)}
    >
      <IconTrash size={18} />
    </ActionIcon>
  );
}

function RunsTable({ runs, onDelete }: RunsListProps) {
  const { say } = useWords();
  return (
    <div className={classes.tableBox}>
      <table className={classes.table}>
        <thead>
          <tr>
            <th scope="col">{say('jobs.runs.column.tag')}</th>
            <th scope="col">{say('jobs.runs.column.status')}</th>
            <th scope="col">{say('jobs.runs.column.strip')}</th>
            <th scope="col">{say('jobs.runs.column.raceway')}</th>
            <th scope="col" className={classes.right}>
              {say('jobs.runs.column.degrees')}
            </th>
            <th scope="col" className={classes.right}>
              {say('jobs.runs.column.fill')}
            </th>
            <th scope="col" className={classes.right}>
              {say('jobs.runs.column.length')}
            </th>
            <th scope="col">{say('jobs.runs.column.revision')}</th>
            <th scope="col">{say('jobs.runs.column.updated')}</th>
            <th scope="col">
              <span className="visually-hidden">{say('jobs.runs.column.actions')}</span>
            </th>
          </tr>
        </thead>
        <tbody>
          {runs.map((run) => {
            const { raceway, degrees, fill, length } = figures(run, say);
            return (
              <tr key={run.id} data-run={run.tag}>
                <td>
                  <Link className={classes.link} to={paths.run(run.jobId, run.id)}>
                    {run.tag}
                  </Link>
                  <span className={classes.small}>{run.title || fromTo(run, say)}</span>
                </td>
                <td>
                  <Result run={run} />
                </td>
                <td>
                  <CompactStrip strip={run.summary.strip} width={STRIP_WIDTH} />
                </td>
                <td>{raceway}</td>
                <td className={`${classes.right} num`}>{degrees}</td>
                <td className={`${classes.right} num`}>{fill}</td>
                <td className={`${classes.right} num`}>{length}</td>
                <td>
                  <Revision run={run} />
                </td>
                <td>
                  {formatMoment(run.updatedAt)}
                  <span className={classes.small}>{run.updatedBy}</span>
                </td>
                <td>
                  <DeleteRun run={run} onDelete={onDelete} />
                </td>
              </tr>
            );
          })}
        </tbody>
      </table>
    </div>
  );
}

function RunCards({ runs, onDelete }: RunsListProps) {
  const { say } = useWords();
  return (
    <ul className={classes.cards}>
      {runs.map((run) => {
        const { raceway, degrees, fill, length } = figures(run, say);
        return (
          <li key={run.id} className={classes.card} data-run={run.tag}>
            <div className={classes.cardHead}>
              <Link className={classes.cardLink} to={paths.run(run.jobId, run.id)}>
                {run.tag}
              </Link>
              <Result run={run} />
            </div>
            <span className={classes.small}>{run.title || fromTo(run, say)}</span>
            <CompactStrip strip={run.summary.strip} width={CARD_STRIP_WIDTH} />
            <div className={classes.cardHead}>
              <span className={classes.small}>{[raceway, degrees, fill, length].join(' · ')}</span>
              <DeleteRun run={run} onDelete={onDelete} />
            </div>
          </li>
        );
      })}
    </ul>
  );
}

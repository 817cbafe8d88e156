import { useWords } from '../../../../hooks/use-words';
import { useRunEditor } from '../../state/use-run-editor';
import classes from './conductors.module.css';
import { FillRow } from './fill-row';

const COLUMNS = ['section', 'in', 'fill', 'room', 'jam', 'clearance'] as const;

/** Fill, room, jam and clearance of each section, with the rule they were held against. */
export function FillAnswers() {
  const { say } = useWords();
  const sections = useRunEditor((state) => state.analysis.sections);
  return (
    <section className={classes.card} aria-labelledby="answers-title">
      <h2 id="answers-title" className={classes.title}>
        {say('workbench.conductors.answers')}
      </h2>
      <div className={classes.scroll}>
        <table className={classes.answers}>
          <thead>
            <tr>
              {COLUMNS.map((column) => (
                <th key={column} scope="col">
                  {say(`workbench.conductors.${column}`)}
                </th>
              ))}
            </tr>
          </thead>
          <tbody>
            {sections.map((section) => (
              <FillRow key={section.id} section={section} />
            ))}
          </tbody>
        </table>
      </div>
    </section>
  );
}

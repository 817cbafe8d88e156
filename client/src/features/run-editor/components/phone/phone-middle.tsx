import { useWords } from '../../../../hooks/use-words';
import { useRunEditor } from '../../state/use-run-editor';
import fieldClasses from '../fields/fields.module.css';
import { useLabelOf } from '../hooks/use-labels';
import { useSelectedPiece } from '../hooks/use-piece';
import { insertionPoint } from '../model/insert-after';
import { SelectedPiece } from '../rail/selected-piece';
import { SketchPanel } from '../rail/sketch-panel';
import { ToFix } from '../rail/to-fix';
import { AddSheet } from './add-sheet';
import { PhoneList } from './phone-list';
import { PhoneSheet } from './phone-sheet';
import classes from './phone.module.css';
import type { PhoneView } from './phone-view';

interface Props {
  view: PhoneView;
  onView: (view: PhoneView) => void;
}

/** The list, or what stands in its place: one piece, the findings, the keys that add, the sketch. */
export function PhoneMiddle({ view, onView }: Props) {
  const { say } = useWords();
  const select = useRunEditor((state) => state.select);
  const afterId = useRunEditor((state) => insertionPoint(state.document, state.selectedId).id);
  const labelOf = useLabelOf();
  const selected = useSelectedPiece();
  const pieceTitle = selected ? labelOf(selected.id) : say('workbench.selected.title');
  const toList = () => onView('list');
  const openPiece = (pieceId: string) => {
    select(pieceId);
    onView('piece');
  };
  switch (view) {
    case 'piece':
      return (
        <PhoneSheet title={pieceTitle} onClose={toList}>
          <SelectedPiece isBare />
        </PhoneSheet>
      );
    case 'fix':
      return (
        <PhoneSheet title={say('workbench.fix.title')} onClose={toList}>
          <ToFix onGo={openPiece} isBare />
        </PhoneSheet>
      );
    case 'add':
      return (
        <AddSheet
          title={say('workbench.add.after', { piece: labelOf(afterId) })}
          onClose={toList}
        />
      );
    case 'list':
    case 'sketch':
      return (
        <>
          <div className={classes.toggle} role="group" aria-label={say('workbench.list.show')}>
            {(['list', 'sketch'] as const).map((option) => (
              <button
                key={option}
                type="button"
                className={fieldClasses.choice}
                aria-pressed={view === option}
                onClick={() => onView(option)}
              >
                {say(option === 'list' ? 'workbench.list.showList' : 'workbench.list.showSketch')}
              </button>
            ))}
          </div>
          {view === 'list' ? <PhoneList onOpen={openPiece} /> : <SketchPanel height={280} />}
        </>
      );
  }
}

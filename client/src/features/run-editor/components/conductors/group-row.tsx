import type { ConductorGroup } from '@fairlead/shared';
import { IconChevronDown, IconChevronUp } from '@tabler/icons-react';
import { useWords } from '../../../../hooks/use-words';
import { useRunEditor } from '../../state/use-run-editor';
import fieldClasses from '../fields/fields.module.css';
import { useEdit } from '../hooks/use-edit';
import { useEnds } from '../hooks/use-ends';
import { useLabelOf } from '../hooks/use-labels';
import { wordGroup, wordWire } from '../model/word-wires';
import { ColourChip } from './colour-chip';
import classes from './conductors.module.css';
import { GroupForm } from './group-form';

interface Props {
  group: ConductorGroup;
  isOpen: boolean;
  onToggle: () => void;
}

/** One group of conductors; opens to change it. */
export function GroupRow({ group, isOpen, onToggle }: Props) {
  const { say } = useWords();
  const labelOf = useLabelOf();
  const ends = useEnds();
  const canEdit = useRunEditor((state) => state.canEdit);
  const edit = useEdit();
  const from = group.from === undefined ? ends.from : labelOf(group.from);
  const to = group.to === undefined ? ends.to : labelOf(group.to);
  const Chevron = isOpen ? IconChevronUp : IconChevronDown;
  return (
    <li className={classes.group} data-group={group.id}>
      <button type="button" className={classes.groupHead} aria-expanded={isOpen} onClick={onToggle}>
        <span className={classes.groupName}>{wordGroup(group, say)}</span>
        <span className={classes.groupUse}>{say(`workbench.conductors.uses.${group.use}`)}</span>
        <span className={classes.groupColour}>
          {group.colour && <ColourChip colour={group.colour} />}
        </span>
        <span className={classes.groupSpan}>{say('workbench.list.section', { from, to })}</span>
        <Chevron size={18} aria-hidden />
      </button>
      {isOpen && (
        <div className={classes.groupForm}>
          <GroupForm group={group} />
          {canEdit && (
            <button
              type="button"
              className={fieldClasses.textButton}
              onClick={() =>
                void edit([{ command: 'remove-conductors', args: { groupId: group.id } }])
              }
            >
              {say('workbench.conductors.remove', { wire: wordWire(group, say) })}
            </button>
          )}
        </div>
      )}
    </li>
  );
}

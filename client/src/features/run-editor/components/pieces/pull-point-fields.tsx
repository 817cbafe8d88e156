import { BODY_TURN, CONDUIT_BODIES, DEVICES, LIMITS, isAccessible } from '@fairlead/shared';
import type { ConduitBody, PullPoint } from '@fairlead/shared';
import { useState } from 'react';
import { useWords } from '../../../../hooks/use-words';
import { useRunEditor } from '../../state/use-run-editor';
import fieldClasses from '../fields/fields.module.css';
import { LegField } from '../fields/leg-field';
import { SelectField } from '../fields/select-field';
import { SwitchField } from '../fields/switch-field';
import { TextField } from '../fields/text-field';
import { usePatch } from '../hooks/use-patch';
import { MoreFields } from './more-fields';
import type { PieceProps } from './piece-fields';
import { PullPointMore } from './pull-point-more';
import { RacewayFromHere } from './raceway-from-here';
import { StartHeading } from './start-heading';
import { TurnFields } from './turn-fields';

/** Bodies that turn the conductors a quarter. */
const TURNING: readonly ConduitBody[] = ['LB', 'LL', 'LR'];

export function PullPointFields({ piece }: PieceProps<PullPoint>) {
  const { say } = useWords();
  const path = useRunEditor((state) => state.document.path);
  const canEdit = useRunEditor((state) => state.canEdit);
  const patch = usePatch(piece.id);
  const [refusal, setRefusal] = useState<string | null>(null);
  const isStart = path[0]?.id === piece.id;
  const isEnd = isStart || path.at(-1)?.id === piece.id;
  const isBody = piece.device === 'conduit-body';

  const chooseBody = (body: ConduitBody | '') => {
    const turns = body !== '' && TURNING.includes(body);
    const turn = turns ? { angle: BODY_TURN, ...piece.turn } : undefined;
    setRefusal(patch({ body: body === '' ? undefined : body, turn }));
  };
  return (
    <>
      <div className={fieldClasses.rowWide}>
        <TextField
          label={say('workbench.field.label')}
          fieldKey={`${piece.id}.label`}
          value={piece.label ?? ''}
          maxLength={LIMITS.label}
          disabled={!canEdit}
          onCommit={(label) => patch({ label: label === '' ? undefined : label })}
        />
        <SelectField
          label={say('workbench.field.device')}
          value={piece.device}
          options={DEVICES.map((value) => ({ value, label: say(`workbench.device.${value}`) }))}
          help={refusal ?? undefined}
          isError={refusal !== null}
          disabled={!canEdit}
          onChange={(device) =>
            setRefusal(patch(device === 'conduit-body' ? { device } : { device, body: undefined }))
          }
        />
        {isBody && (
          <SelectField
            label={say('workbench.field.body')}
            value={piece.body ?? ''}
            options={[
              { value: '' as const, label: say('workbench.field.noBody') },
              ...CONDUIT_BODIES.map((value) => ({ value, label: value })),
            ]}
            disabled={!canEdit}
            onChange={chooseBody}
          />
        )}
      </div>
      {!isStart && <LegField pieceId={piece.id} />}
      {isStart && <StartHeading />}
      <SwitchField
        label={say('workbench.field.accessible')}
        hint={say(isEnd ? 'workbench.field.endAccessible' : 'workbench.field.accessibleHint')}
        checked={isAccessible(piece)}
        disabled={!canEdit || isEnd}
        onChange={(accessible) => setRefusal(patch({ accessible: accessible ? undefined : false }))}
      />
      {!isEnd && <TurnFields piece={piece} />}
      {piece.id !== path.at(-1)?.id && <RacewayFromHere piece={piece} />}
      <MoreFields>
        <PullPointMore piece={piece} />
      </MoreFields>
    </>
  );
}

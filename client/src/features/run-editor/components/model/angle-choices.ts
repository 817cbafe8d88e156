import { analyzeSections, applyCommand } from '@fairlead/shared';
import type { CompanySettings, RunCommand, RunDocument, SectionAnalysis } from '@fairlead/shared';
import type { Piece } from './list-rows';

/** The angles a hand bender's scale offers (common practice, no source). */
const CHOICES: Partial<Record<Piece['kind'], readonly number[]>> = {
  bend: [22.5, 30, 45, 60, 90],
  offset: [10, 22.5, 30, 45, 60],
  'saddle-3': [15, 22.5, 30, 45],
  'saddle-4': [15, 22.5, 30, 45],
  flex: [0, 45, 90, 180],
};

export interface AngleChoice {
  angle: number;
  /** Degrees of the section with this angle. */
  total: number;
  isOver: boolean;
  isChosen: boolean;
  commands: RunCommand[];
}

const PAST_LIMIT = 0.05;

export function angleOf(piece: Piece): number | null {
  switch (piece.kind) {
    case 'bend':
    case 'offset':
    case 'saddle-3':
    case 'saddle-4':
      return piece.angle;
    case 'flex':
      return piece.degrees ?? 90;
    default:
      return null;
  }
}

function sectionHolding(sections: readonly SectionAnalysis[], pieceId: string) {
  return sections.find(({ bends }) => bends.some(({ elementId }) => elementId === pieceId));
}

/** Each usual angle with the section total it would really give: the change is applied and the sections analysed anew. */
export function angleChoices(
  document: RunDocument,
  piece: Piece,
  sectionId: string | null,
  settings?: CompanySettings,
): AngleChoice[] {
  const field = piece.kind === 'flex' ? 'degrees' : 'angle';
  const current = angleOf(piece);
  return (CHOICES[piece.kind] ?? []).flatMap((angle) => {
    const commands: RunCommand[] = [
      { command: 'set-element', args: { elementId: piece.id, patch: { [field]: angle } } },
    ];
    const sections = analyzeSections(commands.reduce(applyCommand, document), settings);
    const section =
      sectionHolding(sections, piece.id) ?? sections.find(({ id }) => id === sectionId);
    if (!section) return [];
    return [
      {
        angle,
        total: section.degrees,
        isOver: section.degrees > section.limitDegrees + PAST_LIMIT,
        isChosen: current !== null && Math.abs(current - angle) < 1e-9,
        commands,
      },
    ];
  });
}

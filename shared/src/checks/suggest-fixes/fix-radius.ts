import type { Finding } from '../../contracts/run-analysis';
import { bendFields, radiusInForce } from '../../run/bend-radius';
import { elementNumber } from '../../run/commands/element-number';
import { expandRun } from '../../run/expand-run';
import type { RunCommand } from '../../run/run-command';
import type { RunDocument } from '../../run/run-document';
import type { Candidate, FixContext } from './candidate';
import { racewaySources, setRaceway } from './raceway-sources';

/**
 * A bend tighter than allowed: the radius somebody gave is taken back, so that the bender's or the table's rules, or it is
 * raised to the least that is allowed.
 */
export function fixRadius(context: FixContext, { at, values }: Finding): Candidate[] {
  const placed = context.expanded.elements.find(({ element }) => element.id === at.elementId);
  const minimum = Number(values.minimum);
  if (!placed || !(minimum > 0)) return [];
  const { element, raceway } = placed;
  const number = elementNumber(context.document, element.id);
  const candidate = (
    commands: RunCommand[],
    radius: number | null,
  ): Candidate<'larger-radius'> => ({
    kind: 'larger-radius',
    commands,
    values: ({ document }) => ({
      elementId: element.id,
      number,
      radius: radius ?? radiusAfter(document, element.id, context),
      tables: radius === null,
    }),
  });
  const onElement = (radius?: number): RunCommand[] => [
    { command: 'set-element', args: { elementId: element.id, patch: { radius } } },
  ];
  if (values.radiusFrom === 'element') {
    return [candidate(onElement(), null), candidate(onElement(minimum), minimum)];
  }
  if (values.radiusFrom !== 'raceway') return [candidate(onElement(minimum), minimum)];
  const { type, tradeSize } = raceway;
  const sources =
    element.kind === 'flex' ? [element.id] : racewaySources(context, at.sectionId ?? '', raceway);
  return [
    candidate(
      sources.map((source) => setRaceway(source, { type, tradeSize })),
      null,
    ),
    candidate(
      sources.map((source) => setRaceway(source, { type, tradeSize, bendRadius: minimum })),
      minimum,
    ),
  ];
}

/** The radius that rules once the given one is taken back. */
function radiusAfter(
  document: RunDocument,
  elementId: string,
  { settings }: FixContext,
): number | null {
  const placed = expandRun(document, settings).elements.find(
    ({ element }) => element.id === elementId,
  );
  return placed ? radiusInForce(bendFields(placed.element), placed.raceway, settings).radius : null;
}

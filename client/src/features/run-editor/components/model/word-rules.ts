import { CODE_EDITIONS } from '@fairlead/shared';
import type { Assumed, CodeEdition, RunDocument } from '@fairlead/shared';
import type { Say } from '../../../../hooks/use-words';

/** The edition in force: the run's own, else the one the analysis took. */
export function editionOf(
  document: Pick<RunDocument, 'rules'>,
  assumed: readonly Assumed[],
): CodeEdition | null {
  const taken = document.rules?.code ?? assumed.find(({ path }) => path === '/rules/code')?.value;
  return CODE_EDITIONS.find((edition) => edition === taken) ?? null;
}

export function wordEdition(edition: CodeEdition, say: Say): string {
  return say('workbench.rules.editionNamed', { year: edition.slice('NEC-'.length) });
}

/** "NEC 2023, power". */
export function wordRules(
  document: Pick<RunDocument, 'rules'>,
  assumed: readonly Assumed[],
  say: Say,
): string {
  const edition = editionOf(document, assumed);
  return say('workbench.rules.button', {
    edition: edition === null ? say('workbench.rules.edition') : wordEdition(edition, say),
    profile: say(`workbench.rules.${document.rules?.profile ?? 'power'}`),
  });
}

import type { Finding } from '../contracts/run-analysis';
import { isAccessible, isPullPoint } from '../run/pull-points';
import type { CodeEdition } from '../run/run-document';
import type { CheckContext } from './check-context';

/** 314.29 was read in transcriptions of 2020 and 2023; other editions are cited from the nearest of them. */
const READ_IN: Record<CodeEdition, CodeEdition> = {
  'NEC-2017': 'NEC-2020',
  'NEC-2020': 'NEC-2020',
  'NEC-2023': 'NEC-2023',
  'NEC-2026': 'NEC-2023',
};

/**
 * A box, body or handhole nobody can reach is not allowed, whatever the degrees (NEC 314.29; a cabinet stands in for a
 * box, 300.15(I)). An open end of pipe is no enclosure: it only doesn't end a section.
 */
export function checkAccess({ expanded, edition }: CheckContext): Finding[] {
  return expanded.elements.flatMap(({ element, section }): Finding[] => {
    if (!isPullPoint(element) || isAccessible(element) || element.device === 'open-end') return [];
    const sectionId = expanded.sections[section]?.id;
    return [
      {
        code: 'access-not-allowed',
        severity: 'stop',
        at: { elementId: element.id, sectionId },
        values: { device: element.device, body: element.body ?? null },
        rule: { cite: '314.29', edition: READ_IN[edition], source: 'NEC' },
      },
    ];
  });
}

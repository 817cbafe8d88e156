import type { ConductorGroup } from '@fairlead/shared';
import type { Say } from '../../../../hooks/use-words';

/** What a group is made of: "12 THHN Cu", or the cable's own name. */
export function wordWire(group: ConductorGroup, say: Say): string {
  if ('cable' in group) return group.cable.name;
  return say('workbench.conductors.wire', {
    size: group.size,
    insulation: say(`workbench.conductors.insulations.${group.insulation}`),
    material: say(`workbench.conductors.materials.${group.material}`),
  });
}

export function wordGroup(group: ConductorGroup, say: Say): string {
  return say('workbench.conductors.group', { count: group.count, wire: wordWire(group, say) });
}

/** "3 × 10 THHN Cu", groups of one wire added up; "no wires". */
export function wordWires(groups: readonly ConductorGroup[], say: Say): string {
  if (groups.length === 0) return say('workbench.raceway.noWires');
  const counts = new Map<string, number>();
  for (const group of groups) {
    const wire = wordWire(group, say);
    counts.set(wire, (counts.get(wire) ?? 0) + group.count);
  }
  return Array.from(counts, ([wire, count]) =>
    say('workbench.conductors.group', { count, wire }),
  ).join(', ');
}

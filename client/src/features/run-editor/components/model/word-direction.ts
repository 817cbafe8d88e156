import { formatAngle } from '@fairlead/shared';
import type { Direction } from '@fairlead/shared';
import type { Say } from '../../../../hooks/use-words';

/** A direction in words: "north", or "45° from north, 10° up". */
export function wordDirection(direction: Direction, say: Say): string {
  if (typeof direction === 'string') return say(`workbench.direction.lower.${direction}`);
  const { azimuth, elevation } = direction;
  const level =
    elevation === 0
      ? say('workbench.direction.level')
      : say(`workbench.direction.${elevation > 0 ? 'above' : 'below'}`, {
          angle: formatAngle(Math.abs(elevation)),
        });
  return say('workbench.direction.exact', { azimuth: formatAngle(azimuth), elevation: level });
}

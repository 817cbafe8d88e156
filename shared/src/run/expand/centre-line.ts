import { rotateAbout } from '../../geometry/turn';
import { ORIGIN, add, cross, scale, subtract, unit } from '../../geometry/vector';
import type { Vector } from '../../geometry/vector';
import type { CentreLinePiece, PlacedBend } from '../expanded-run';
import type { PathElement } from '../run-document';
import type { Headings } from './headings';
import type { Stretch } from './lay-out';

/**
 * The centre line in 3-D from the origin: lines and arcs, each beginning where the one before it ends.
 *
 * Arc: with unit heading h and bend plane axis a (right-handed), the centre is p + R(a × h), and both the end point and
 * the heading are turned about a by θ. A flexible piece has no direction of its own and is carried straight on.
 */
export function centreLine(
  path: readonly PathElement[],
  stretches: readonly Stretch[],
  bends: readonly PlacedBend[],
  headings: Headings,
): CentreLinePiece[] {
  const pieces: CentreLinePiece[] = [];
  let point: Vector = ORIGIN;
  let heading: Vector = headings.of[0]?.before ?? { x: 1, y: 0, z: 0 };

  for (const stretch of stretches) {
    const elementId = path[stretch.elementIndex]?.id ?? '';
    const way = headings.of[stretch.elementIndex];
    if (stretch.kind === 'wall') {
      heading = way?.after ?? heading;
      continue;
    }
    const { from, to } = stretch;
    const start = point;
    if (stretch.kind === 'line') {
      point = add(start, scale(heading, to - from));
      pieces.push({ kind: 'line', elementId, from, to, start, end: point });
      continue;
    }
    const bend = bends[stretch.bend];
    if (!bend || !way?.before || !way.sideways) continue;
    const axis = scale(unit(cross(way.before, way.sideways)), stretch.sense);
    const { angle } = bend;
    const radius = bend.radius ?? 0;
    const centre = add(start, scale(cross(axis, heading), radius));
    point = add(centre, rotateAbout(subtract(start, centre), axis, angle));
    heading = unit(rotateAbout(heading, axis, angle));
    if (radius > 0) {
      pieces.push({
        kind: 'arc',
        elementId,
        from,
        to,
        start,
        end: point,
        centre,
        axis,
        angle,
        radius,
      });
    }
  }
  return pieces;
}

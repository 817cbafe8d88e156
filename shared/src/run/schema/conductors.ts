import * as z from 'zod/mini';
import { BOUNDS } from '../document-bounds';
import {
  CONDUCTOR_USES,
  INSULATIONS,
  MATERIALS,
  PHASES,
  STRANDINGS,
  WIRE_COLOURS,
  WIRE_SIZES,
} from '../run-document';
import { dimension, id, name, positive, whole } from './primitives';

const common = {
  id,
  count: whole(1, BOUNDS.count),
  use: z.enum(CONDUCTOR_USES),
  colour: z.optional(z.enum(WIRE_COLOURS)),
  from: z.optional(id),
  to: z.optional(id),
  phase: z.optional(z.enum(PHASES)),
};

export const wireGroup = z.strictObject({
  ...common,
  size: z.enum(WIRE_SIZES),
  insulation: z.enum(INSULATIONS),
  material: z.enum(MATERIALS),
  stranding: z.enum(STRANDINGS),
});

export const cableGroup = z.strictObject({
  ...common,
  cable: z.strictObject({
    name: name(BOUNDS.cableName),
    od: dimension,
    weight: positive(BOUNDS.weight),
    maxTension: positive(BOUNDS.force),
    conductors: z.optional(whole(1, BOUNDS.count)),
    maxSidewall: z.optional(positive(BOUNDS.force)),
    minBendRadius: z.optional(dimension),
  }),
});

/** The two kinds of group have no field that names them: a group that speaks of a cable is read as one. */
export function groupSchema(value: unknown): typeof wireGroup | typeof cableGroup {
  const isCable = typeof value === 'object' && value !== null && 'cable' in value;
  return isCable ? cableGroup : wireGroup;
}

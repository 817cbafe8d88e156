import { formatLength } from '@fairlead/shared';

/** A length as lists show it, to the nearest inch; what is shorter than that keeps its fraction. */
export function listLength(inches: number): string {
  const rounded = Math.abs(inches) < 1 ? inches : Math.round(inches);
  return formatLength(rounded);
}

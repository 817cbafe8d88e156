import type { CompanySettings } from '../contracts/settings';
import { bendRadiusFor } from '../tables/bend-radius';
import type { Made, PathElement, Raceway } from './run-document';

export interface RadiusInForce {
  /** Centre-line radius, in; null where nothing gives one. */
  radius: number | null;
  from: 'element' | 'raceway' | 'settings' | 'table' | 'nothing';
}

/**
 * The radius a bend is made at: the element's, else the raceway's, else the company's bender for that size (not for a
 * factory elbow, which no bender makes), else the table's.
 */
export function radiusInForce(
  bend: { radius?: number; made?: Made },
  raceway: Raceway,
  settings: CompanySettings,
): RadiusInForce {
  if (bend.radius !== undefined) return { radius: bend.radius, from: 'element' };
  if (typeof raceway.bendRadius === 'number')
    return { radius: raceway.bendRadius, from: 'raceway' };
  const bender = bend.made === 'factory' ? undefined : benderFor(raceway, settings);
  if (bender) return { radius: bender.radius, from: 'settings' };
  const radius = bendRadiusFor(raceway.type, raceway.tradeSize);
  return { radius, from: radius === null ? 'nothing' : 'table' };
}

function benderFor(raceway: Raceway, settings: CompanySettings) {
  return settings.benders.find(
    ({ type, tradeSize }) => type === raceway.type && tradeSize === raceway.tradeSize,
  );
}

/** The radius fields of an element that has them. */
export function bendFields(element: PathElement): { radius?: number; made?: Made } {
  switch (element.kind) {
    case 'bend':
    case 'offset':
      return { radius: element.radius, made: element.made };
    case 'saddle-3':
    case 'saddle-4':
      return { radius: element.radius };
    default:
      return {};
  }
}

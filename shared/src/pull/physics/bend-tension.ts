import type { BendWay, Load } from './load';
import { solveSlope } from './solve-slope';
import { uprightTension } from './upright-bend';

/** Below this a bend lies in a level or an upright plane. */
const FLAT = 1e-12;
const TOLERANCE = 1e-13;
/** e to this is past every tension told apart, and still a number. */
const MOST_TURN = 200;
/** Past this nobody asks how much more, lbf. */
const ENOUGH = 1e7;

/**
 * Tension leaving a bend in any plane, lbf: dT/dψ = W·R·t_z + f·|W·R·z⊥ − T·n|, t the heading, n the normal toward the
 * centre, z up. The cable bears on the inner wall where the tension wins and on the outer wall where the weight does.
 *
 * Level plane: T·cosh fθ + √(T² + (WR)²)·sinh fθ. Upright plane while the tension wins all along: the four vertical forms
 * in one. Everything else is integrated. At W·R = 0 it is T·e^(fθ).
 *
 * Source: equilibrium of a cable on a curve with friction; the level and vertical forms as handbooks print them, from
 * memory, checked by integration.
 *
 * @example bendTension(0, { angle: Math.PI / 2, radius: 4, headingUp: 0, normalUp: 0 }, { weight: 5, friction: 0.35 }) // 11.5579
 */
export function bendTension(tension: number, way: BendWay, load: Load): number {
  const { angle } = way;
  const { friction } = load;
  const heft = load.weight * way.radius;
  const turn = Math.min(friction * angle, MOST_TURN);
  if (heft === 0) return tension * Math.exp(turn);
  if (isLevel(way)) {
    // cosh and sinh of one exponential: this line is most of the work of a run.
    const grown = Math.expm1(turn);
    const shrunk = grown / (1 + grown);
    const cosh = 1 + (grown - shrunk) / 2;
    const sinh = (grown + shrunk) / 2;
    return tension * cosh + Math.sqrt(tension * tension + heft * heft) * sinh;
  }
  return solveBend(tension, way, heft, friction);
}

/**
 * The least tension entering a bend that keeps the cable taut all along it and leaves it with `tension`, lbf.
 *
 * @example bendFeed(11.5579, { angle: Math.PI / 2, radius: 4, headingUp: 0, normalUp: 0 }, { weight: 5, friction: 0.35 }) // 0
 */
export function bendFeed(tension: number, way: BendWay, load: Load): number {
  const { angle } = way;
  const { friction } = load;
  const heft = load.weight * way.radius;
  if (heft === 0) return tension * Math.exp(-friction * angle);
  if (isLevel(way)) {
    const sinh = Math.sinh(friction * angle);
    if (heft * sinh >= tension) return 0;
    return tension * Math.cosh(friction * angle) - Math.hypot(tension, heft) * sinh;
  }
  const backOver = (from: number, to: number, leaving: number): number =>
    solveBend(leaving, metFrom(way, from, from - to), heft, -friction);
  // Beyond the steep part a cable held by nothing stays where it is; on it and before it what is needed may grow.
  const steep = endOfSteepPart(way, friction);
  const isSlack = tension === 0 || steep === angle;
  const held = isSlack ? tension : Math.max(0, backOver(angle, steep, tension));
  return steep > 0 ? Math.max(0, backOver(steep, 0, held)) : held;
}

/** Upright bends in closed form, all others by integration; a negative friction walks against the pull. */
function solveBend(tension: number, way: BendWay, heft: number, friction: number): number {
  if (sidewaysUp(way) === 0) return uprightTension(tension, way, heft, friction);
  const tolerance = TOLERANCE * (heft + tension);
  const slope = slopeOf(way, heft, friction);
  return solveSlope(slope, tension, way.angle, { tolerance, enough: ENOUGH });
}

/** The bend met against the pull: from a place in it, over an angle back. */
function metFrom({ radius, headingUp, normalUp }: BendWay, place: number, angle: number): BendWay {
  const [cos, sin] = [Math.cos(place), Math.sin(place)];
  return {
    angle,
    radius,
    headingUp: -(headingUp * cos + normalUp * sin),
    normalUp: normalUp * cos - headingUp * sin,
  };
}

function slopeOf(way: BendWay, heft: number, friction: number) {
  const { headingUp, normalUp } = way;
  const across = heft * sidewaysUp(way);
  return (turned: number, tension: number): number => {
    const cos = Math.cos(turned);
    const sin = Math.sin(turned);
    const along = heft * (headingUp * cos + normalUp * sin);
    const inward = heft * (normalUp * cos - headingUp * sin) - tension;
    return along + friction * Math.hypot(inward, across);
  };
}

const isLevel = ({ headingUp, normalUp }: BendWay): boolean =>
  Math.abs(headingUp) < FLAT && Math.abs(normalUp) < FLAT;

/** Upward part of the axis the bend turns about, unsigned. */
function sidewaysUp({ headingUp, normalUp }: BendWay): number {
  const square = 1 - headingUp * headingUp - normalUp * normalUp;
  return square < FLAT ? 0 : Math.sqrt(square);
}

/**
 * Where in the bend, rad, the cable last runs by its own weight: the heading falls more steeply than friction holds,
 * tan α < −f. 0: nowhere.
 */
function endOfSteepPart({ angle, headingUp, normalUp }: BendWay, friction: number): number {
  const steepest = Math.hypot(headingUp, normalUp);
  const holds = friction / Math.sqrt(1 + friction * friction);
  if (steepest <= holds) return 0;
  // The heading's height is steepest · cos(ψ − highest): too low between two angles about half a turn from its highest.
  const highest = Math.atan2(normalUp, headingUp);
  const half = Math.acos(holds / steepest);
  for (const turn of [-1, 0, 1]) {
    const middle = highest + Math.PI + turn * 2 * Math.PI;
    if (middle - half < angle && middle + half > 0) return Math.min(angle, middle + half);
  }
  return 0;
}

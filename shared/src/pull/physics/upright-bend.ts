import type { BendWay } from './load';

/** A crossing is looked for between this many places of the bend, then closed in on. */
const PLACES = 32;
const HALVINGS = 60;
/** From one wall to the other and back, with one to spare. */
const MOST_CROSSINGS = 4;

/** The part of the weight that pulls the cable off the inner wall, per W·R. */
const inwardAt = ({ headingUp, normalUp }: BendWay, turned: number): number =>
  normalUp * Math.cos(turned) - headingUp * Math.sin(turned);

/**
 * Tension leaving a bend in an upright plane, lbf, in closed form: with the bracket's sign s kept,
 * T = (T₁ − W·R·a)·e^(s·f·θ) + W·R·(a·cos θ + b·sin θ), and from where the cable changes walls with the other sign.
 * `heft` W·R in lbf. A negative friction walks the bend against the pull.
 *
 * @example uprightTension(500, { angle: Math.PI / 2, radius: 4, headingUp: 0, normalUp: -1 }, 20, 0.3) // 785.2494
 */
export function uprightTension(
  tension: number,
  way: BendWay,
  heft: number,
  friction: number,
): number {
  // Losing W·R for each radian at most, and with friction against it a power of e, this one never leaves the inner wall.
  const spent = friction >= 0 ? 1 : 1 + Math.exp(-friction * way.angle);
  if (tension >= heft * (2 + way.angle) * spent) {
    return keepingSide(tension, way, heft, friction, 0)(way.angle);
  }
  let from = 0;
  let entering = tension;
  // Which wall the cable bears on: +1 the inner, −1 the outer.
  let side = tension - heft * inwardAt(way, 0) >= 0 ? 1 : -1;
  for (let crossing = 0; crossing < MOST_CROSSINGS; crossing += 1) {
    const start = from;
    const leaving = keepingSide(entering, way, heft, side * friction, start);
    const lead = (turned: number) => side * (leaving(turned) - heft * inwardAt(way, turned));
    const place = firstChange(lead, start, way.angle);
    if (place === null) return leaving(way.angle);
    entering = heft * inwardAt(way, place);
    from = place;
    side = -side;
  }
  return keepingSide(entering, way, heft, side * friction, from)(way.angle);
}

/** The tension along the bend from a place on, while the cable keeps to one wall. */
function keepingSide(
  tension: number,
  { headingUp, normalUp }: BendWay,
  heft: number,
  friction: number,
  from: number,
): (turned: number) => number {
  const square = 1 + friction * friction;
  const a = -((1 - friction * friction) * normalUp + 2 * friction * headingUp) / square;
  const b = headingUp - friction * normalUp + friction * a;
  const weight = (turned: number) => heft * (a * Math.cos(turned) + b * Math.sin(turned));
  const free = tension - weight(from);
  return (turned) => free * Math.exp(friction * (turned - from)) + weight(turned);
}

/** Where a lead that begins above nothing is first lost before `end`; null where it is kept. */
function firstChange(lead: (turned: number) => number, start: number, end: number): number | null {
  const step = (end - start) / PLACES;
  for (let place = 1; place <= PLACES; place += 1) {
    const turned = place === PLACES ? end : start + place * step;
    if (lead(turned) >= 0) continue;
    let [kept, lost] = [start + (place - 1) * step, turned];
    for (let halving = 0; halving < HALVINGS; halving += 1) {
      const middle = (kept + lost) / 2;
      if (lead(middle) >= 0) kept = middle;
      else lost = middle;
    }
    // The very start is where the last crossing was: the lead must first be won.
    return lost > start ? lost : null;
  }
  return null;
}

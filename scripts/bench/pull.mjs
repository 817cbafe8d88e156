// The pull of a run of 60 pieces, beside the same chain in a spreadsheet's formulas and in bare arithmetic.
import { createRequire } from 'node:module';
import { ms, percentile, timed } from './figures.mjs';
import { say } from '../lib/say.mjs';

const require = createRequire(import.meta.url);
const { analyzeRun, buildRun, pullPoint, straight, bend, wires } = require('@fairlead/shared');
const FormulaParser = require('fast-formula-parser');

const FRICTIONS = [0.2, 0.35, 0.5];
const RADIUS = 13;
const LEG = 140;

/** Two ends and 29 bends with 29 legs: sixty pieces, one section, all level. */
function levelRun() {
  const pairs = Array.from({ length: 29 }, () => [
    straight({ length: LEG }),
    bend({ angle: 12, radius: RADIUS }),
  ]).flat();
  return buildRun({
    tag: 'B-2',
    raceway: { type: 'EMT', tradeSize: '3' },
    path: [pullPoint(), ...pairs, pullPoint()],
    conductors: [wires({ count: 3, size: '500' }), wires({ count: 1, size: '3', use: 'ground' })],
    conditions: { feedTension: 10 },
  });
}

/** The pieces as the engine meets them, in ft and rad, forward. */
function chainOf(document, { pulls }) {
  const [{ weight, weightCorrection, forward }] = pulls;
  const bends = forward.profile.slice(1);
  let from = forward.profile[0].station;
  const pieces = bends.map(({ station, sidewall }) => {
    const length = (station - from) / 12;
    from = station;
    return sidewall ? { angle: (12 * Math.PI) / 180 } : { length };
  });
  return { pieces, weight, weightCorrection, radius: RADIUS / 12 };
}

function bare({ pieces, weight, weightCorrection, radius }, friction, feed) {
  const f = friction * weightCorrection;
  const heft = weight * radius;
  let tension = feed;
  for (const { angle, length } of pieces) {
    tension = angle
      ? tension * Math.cosh(f * angle) +
        Math.sqrt(tension * tension + heft * heft) * Math.sinh(f * angle)
      : tension + weight * length * f;
  }
  return tension;
}

/** Column A holds the tension leaving each piece; row 1 is the feed. */
function sheet({ pieces, weight, weightCorrection, radius }, friction, feed) {
  const f = friction * weightCorrection;
  const heft = weight * radius;
  const cells = [feed];
  const parser = new FormulaParser({ onCell: ({ row }) => cells[row - 1] });
  for (const [index, { angle, length }] of pieces.entries()) {
    const before = `A${index + 1}`;
    const formula = angle
      ? `${before}*COSH(${f * angle})+SQRT(${before}^2+${heft}^2)*SINH(${f * angle})`
      : `${before}+${weight}*${length}*${f}`;
    cells.push(parser.parse(formula, { sheet: 'S', row: index + 2, col: 1 }));
  }
  return cells[cells.length - 1];
}

export async function benchPull() {
  const document = levelRun();
  const analysis = analyzeRun(document);
  const chain = chainOf(document, analysis);
  const back = { ...chain, pieces: [...chain.pieces].reverse() };
  const all = (one) => FRICTIONS.flatMap((mu) => [one(chain, mu, 10), one(back, mu, 10)]);
  const wanted = analysis.pulls[0].forward.tension.likely;
  for (const figure of [bare(chain, 0.35, 10), sheet(chain, 0.35, 10)]) {
    if (Math.abs(figure / wanted - 1) > 1e-9) throw new Error(`${figure} is not ${wanted}`);
  }
  // In turns: a machine that slows down half way slows all three.
  const rounds = [];
  for (let round = 0; round < 20; round += 1) {
    const median = async (runs, work) => percentile(await timed(runs, work), 0.5);
    rounds.push({
      engine: await median(100, () => analyzeRun(document)),
      inSheet: await median(2, () => all(sheet)),
      unrolled: await median(100, () => all(bare)),
    });
  }
  const middle = (of) => percentile(rounds.slice(5).map(of), 0.5);
  say(
    `analysis of a run of ${document.path.length} pieces, pull and all: median ${ms(middle(({ engine }) => engine))}; ` +
      `its tension chain alone in a spreadsheet's formulas ${ms(middle(({ inSheet }) => inSheet))}, ` +
      `${middle(({ engine, inSheet }) => inSheet / engine).toFixed(0)} times as long (wanted: 50 at least); ` +
      `in bare arithmetic ${ms(middle(({ unrolled }) => unrolled))}, ` +
      `ratio ${middle(({ engine, unrolled }) => engine / unrolled).toFixed(0)}`,
  );
}

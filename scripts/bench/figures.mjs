// Medians, percentiles and one way of printing them.
import { say } from '../lib/say.mjs';

export function percentile(times, share) {
  const sorted = [...times].sort((a, b) => a - b);
  return sorted[Math.min(sorted.length - 1, Math.floor(sorted.length * share))];
}

export const ms = (time) => `${time < 10 ? time.toFixed(3) : time.toFixed(1)} ms`;

/** Times of `runs` calls, after as many to warm up, in ms. */
export async function timed(runs, work) {
  for (let run = 0; run < runs; run += 1) await work(run);
  const times = [];
  for (let run = 0; run < runs; run += 1) {
    const from = performance.now();
    await work(run);
    times.push(performance.now() - from);
  }
  return times;
}

export function report(name, times, baseline, baselineName) {
  const [median, p95] = [percentile(times, 0.5), percentile(times, 0.95)];
  const against = baseline
    ? `; ${baselineName} ${ms(percentile(baseline, 0.5))} (p95 ${ms(percentile(baseline, 0.95))}), ratio ${(median / percentile(baseline, 0.5)).toFixed(2)}`
    : '';
  say(`${name}: median ${ms(median)}, p95 ${ms(p95)}${against}`);
}

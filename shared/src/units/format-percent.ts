/** @example formatPercent(33.13) // "33.1 %" */
export function formatPercent(percent: number): string {
  return `${numberText(percent, 1)} %`;
}

/**
 * A percent beside its limit: one decimal, or as many more as keep it from reading as equal when it is not.
 *
 * @example formatPercentBeside(40.04, 40) // "40.04 of 40 %"
 */
export function formatPercentBeside(percent: number, limit: number): string {
  const readsEqual = (decimals: number) => Number(percent.toFixed(decimals)) === limit;
  const decimals = [1, 2, 3, 4].find((each) => !readsEqual(each)) ?? 1;
  return `${numberText(percent, decimals)} of ${numberText(limit, 1)} %`;
}

function numberText(value: number, decimals: number): string {
  if (!Number.isFinite(value)) throw new RangeError(`not a percent: ${value}`);
  return String(Number(value.toFixed(decimals)));
}

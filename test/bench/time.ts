/** Median time of one run, ms, after as many runs to warm up. */
export function medianTime(runs: number, run: () => unknown): number {
  const took: number[] = [];
  for (let i = 0; i < 2 * runs; i++) {
    const began = performance.now();
    run();
    if (i >= runs) took.push(performance.now() - began);
  }
  return took.sort((a, b) => a - b)[took.length >> 1] ?? Number.NaN;
}

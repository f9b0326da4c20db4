/** Seconds that a call takes. */
export function timed(call: () => unknown): number {
  const began = performance.now();
  call();
  return (performance.now() - began) / 1000;
}

export function median(values: readonly number[]): number {
  const sorted = [...values].sort((one, other) => one - other);
  return sorted[Math.floor(sorted.length / 2)]!;
}

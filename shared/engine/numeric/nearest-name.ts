/** Edits (insert, remove, replace) that turn one name into the other. */
function editDistance(a: string, b: string): number {
  let previous = Array.from({ length: b.length + 1 }, (_, index) => index);
  for (let i = 1; i <= a.length; i++) {
    const current = [i];
    for (let j = 1; j <= b.length; j++) {
      const replaced = (previous[j - 1] ?? 0) + (a[i - 1] === b[j - 1] ? 0 : 1);
      current.push(Math.min(replaced, (previous[j] ?? 0) + 1, (current[j - 1] ?? 0) + 1));
    }
    previous = current;
  }
  return previous[b.length] ?? 0;
}

/** The known name most like the given one, or undefined when none is near (more than a third is different). */
export function nearestName(given: string, known: readonly string[]): string | undefined {
  if (given.length > 60) return undefined;
  const wanted = given.toLowerCase().replaceAll(/[\s-]/g, '_');
  let best: string | undefined;
  let least = Math.max(2, wanted.length / 3) + 1e-9;
  for (const name of known) {
    const distance = editDistance(wanted, name.toLowerCase());
    if (distance < least) {
      least = distance;
      best = name;
    }
  }
  return best;
}

/**
 * Puts names in an order in which each stands after those it needs, as near as can be to the order given.
 * @param needs for each name, the names it needs; those that are not keys themselves are there from the start
 * @returns the order, or the names of one circle in order, the first again at its end
 */
export function orderOf(
  needs: ReadonlyMap<string, readonly string[]>,
):
  | { readonly ok: true; readonly order: readonly string[] }
  | { readonly ok: false; readonly circle: readonly string[] } {
  const done = new Set<string>();
  const path: string[] = [];

  const visit = (name: string): readonly string[] | undefined => {
    if (done.has(name) || !needs.has(name)) return undefined;
    const from = path.indexOf(name);
    if (from >= 0) return [...path.slice(from), name];
    path.push(name);
    for (const needed of needs.get(name) ?? []) {
      const circle = visit(needed);
      if (circle !== undefined) return circle;
    }
    path.pop();
    done.add(name);
    return undefined;
  };

  for (const name of needs.keys()) {
    const circle = visit(name);
    if (circle !== undefined) return { ok: false, circle };
  }
  return { ok: true, order: [...done] };
}

import type { ResultAxes, Revision } from '@shared/contracts/revisions.ts';
import { computed } from 'vue';
import { useRoute, useRouter } from 'vue-router';
import { readAddress, writeAddress } from './address.ts';
import { dimensionsOf } from './dimensions.ts';
import { fittingLayout, tableOf, usualLayout, type CellPlace, type Layout } from './layout.ts';

/** How the table is laid out, which cell is chosen and whether the heat map is on: all of it in the page's address. */
export function useResultsTable(revision: Revision, axes: ResultAxes) {
  const route = useRoute();
  const router = useRouter();
  const dimensions = dimensionsOf(axes, revision.family.kind);
  const usual = usualLayout(dimensions, axes.senses[0] ?? 'tension');
  const address = computed(() => readAddress(route.query));

  const layout = computed<Layout>(() => {
    const asked = { ...usual, ...address.value.layout };
    const sense = axes.senses.includes(asked.sense) ? asked.sense : usual.sense;
    return fittingLayout({ ...asked, sense }, dimensions);
  });
  const table = computed(() => tableOf(layout.value, dimensions));
  const heat = computed(() => address.value.heat);
  const chosen = computed(() => {
    const cell = address.value.cell;
    return cell && cell.ordinal < axes.variants && cell.angle < axes.angles.length ? cell : null;
  });

  /** A new layout is a step that the back button undoes; a chosen cell or the heat map is none. */
  function lay(patch: Partial<Layout>): void {
    const next = fittingLayout({ ...layout.value, ...patch }, dimensions);
    void router.push({ query: writeAddress(next, chosen.value, heat.value) });
  }
  function choose(cell: CellPlace | null): void {
    void router.replace({ query: writeAddress(layout.value, cell, heat.value) });
  }
  function showHeat(on: boolean): void {
    void router.replace({ query: writeAddress(layout.value, chosen.value, on) });
  }
  return { dimensions, layout, table, heat, chosen, lay, choose, showHeat };
}

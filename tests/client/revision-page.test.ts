import { describe, expect, it } from 'vitest';
import DefinitionSummary from '../../src/components/revision/DefinitionSummary.vue';
import LifeLine from '../../src/components/revision/LifeLine.vue';
import { lifeOf } from '../../src/components/revision/life.ts';
import { mountInApp } from '../support/client/mount.ts';
import { definition, revisionWith } from './support/revisions.ts';

const placesOf = (more: Parameters<typeof revisionWith>[1]) =>
  lifeOf(revisionWith({}, more)).map(({ state, place }) => `${state} ${place}`);

describe('the life of a revision', () => {
  it('stands at its state, with what is behind and ahead', () => {
    expect(placesOf({ state: 'checked' })).toEqual([
      'draft done',
      'swept done',
      'in-check done',
      'checked here',
      'published ahead',
      'locked ahead',
    ]);
  });

  it('ends with how it went out of force, and says whether it was ever locked', () => {
    expect(placesOf({ state: 'withdrawn', lockedAt: null }).slice(-3)).toEqual([
      'published done',
      'locked skipped',
      'withdrawn here',
    ]);
    expect(placesOf({ state: 'superseded', lockedAt: '2026-11-29T08:00:00Z' }).slice(-2)).toEqual([
      'locked done',
      'superseded here',
    ]);
  });

  it('names the present state to who listens, and who signed', async () => {
    await mountInApp(LifeLine, {
      props: {
        revision: revisionWith(
          {},
          {
            state: 'published',
            checker: { id: 3, name: 'Oluchi Venter' },
            checkedAt: '2026-11-27T12:00:00Z',
          },
        ),
      },
    });
    const here = document.querySelector('[aria-current="step"]');
    expect(here?.textContent).toContain('Published');
    expect(document.querySelector('ol')?.textContent).toMatch(/Checked, done\s*Oluchi Venter\s*27 Nov 2026/);
  });
});

describe('the summary of a definition', () => {
  const rowOf = (name: string) => {
    const head = [...document.querySelectorAll('tbody th')].find((one) => one.textContent === name);
    return [...(head?.parentElement?.querySelectorAll('td') ?? [])].map((cell) => cell.textContent?.trim());
  };

  it('lists swept and fixed parameters with symbol, values and unit', async () => {
    await mountInApp(DefinitionSummary, { props: { definition } });
    expect(rowOf('Plate thickness')).toEqual(['t', '10 to 16 in steps of 2', 'mm', '4']);
    expect(rowOf('Bolt size')).toEqual(['d', 'M20, M24', '', '2']);
    expect(rowOf('Weld leg')).toEqual(['z', '6', 'mm']);
    expect(rowOf('Outline')).toEqual(['', 'Rectangular', '']);
  });

  it('says the load angles and their count', async () => {
    await mountInApp(DefinitionSummary, { props: { definition } });
    expect(document.querySelector('dl')?.textContent).toContain('−60 to 60 in steps of 5 (25 angles)');
  });
});

import { defineComponent, h, nextTick, reactive } from 'vue';
import { describe, expect, it } from 'vitest';
import { findKind } from '@shared/engine/index.ts';
import type { DetailKind, ParameterSpec } from '@shared/engine/types.ts';
import CountBar from '../../src/components/family-editor/CountBar.vue';
import { countsOf } from '../../src/components/family-editor/counts.ts';
import { newDraft, type ParameterDraft } from '../../src/components/family-editor/draft.ts';
import ParameterField from '../../src/components/family-editor/ParameterField.vue';
import { readDraft } from '../../src/components/family-editor/read-draft.ts';
import { mountInApp } from '../support/client/mount.ts';
import { fieldLabelled, labelled, messages, radio } from './queries.ts';

const kind = findKind('gusset-plate') as DetailKind;
const settings = { increment: 1, factors: { gammaM0: 1, gammaM1: 1, gammaM2: 1.25 } };

/** One parameter of a whole form, with the count of the sweep above it. */
async function show(name: string): Promise<ParameterDraft> {
  const draft = reactive(newDraft(kind, 'sans-10162-1-2011', settings));
  const spec = kind.parameters.find((one) => one.name === name) as ParameterSpec;
  const own = draft.parameters[name] as ParameterDraft;
  const whole = defineComponent({
    render() {
      const { faults, settings: read, angles } = readDraft(draft, kind);
      return [
        h(CountBar, { counts: countsOf(read, angles, 2), faults: faults.length }),
        h(ParameterField, { modelValue: own, spec, catalogue: null, faults }),
      ];
    },
  });
  await mountInApp(whole);
  return own;
}

const sizes = () =>
  document.querySelector('[aria-label="Size of the sweep"]')?.textContent?.replace(/\s+/g, ' ') ?? '';

async function choose(mode: string): Promise<void> {
  const input = radio('Pitch', mode);
  input.checked = true;
  input.dispatchEvent(new Event('change', { bubbles: true }));
  await nextTick();
}

describe('a parameter', () => {
  it('is fixed at first, with its unit', async () => {
    await show('pitch');
    expect(radio('Pitch', 'Fixed').checked).toBe(true);
    expect(labelled('Pitch').closest('.v-input')?.textContent).toContain('mm');
    expect(sizes()).toContain('1 variant');
  });

  it('shows a fault with field, value and limit, and keeps what was typed', async () => {
    await show('pitch');
    fieldLabelled('Pitch', '9 inches');
    await nextTick();
    expect(messages()).toEqual(['Pitch must be a number from 10 to 500 mm; “9 inches” was given.']);
    expect(labelled('Pitch').value).toBe('9 inches');
    expect(sizes()).toContain('One entry is not right yet.');
  });

  it('is swept from–to by step, starting from the value it had, and the count follows as it is typed', async () => {
    const draft = await show('pitch');
    await choose('From–to');
    expect(draft.range).toEqual({ from: '70', to: '70', step: '1' });
    fieldLabelled('Pitch, to', '90');
    fieldLabelled('Pitch, step', '5');
    await nextTick();
    expect(sizes()).toContain('5 variants');
    fieldLabelled('Pitch, to', '60');
    await nextTick();
    expect(messages()).toEqual(['Pitch, to, must not be below from, 70; 60 was given.']);
  });

  it('keeps each mode’s entries when the mode is changed to and fro', async () => {
    const draft = await show('pitch');
    await choose('List');
    expect(draft.list).toEqual(['70']);
    await choose('From–to');
    fieldLabelled('Pitch, to', '120');
    await choose('Fixed');
    await choose('From–to');
    expect(labelled('Pitch, to').value).toBe('120');
    expect(draft.list).toEqual(['70']);
  });
});

describe('a list of values', () => {
  const typeOn = async (text: string) => {
    for (const end of Array.from(text, (_, at) => at + 1)) {
      const input = labelled('Pitch, values');
      fieldLabelled('Pitch, values', input.value + text.slice(end - 1, end));
      await nextTick();
    }
  };

  it.each([
    ['80 85 ', ['70', '80', '85']],
    ['80; 85; ', ['70', '80', '85']],
    ['80, 85.5, ', ['70', '80', '85.5']],
  ])('takes "%s" as it is typed', async (text, expected) => {
    const draft = await show('pitch');
    await choose('List');
    await typeOn(text);
    expect(draft.list).toEqual(expected);
    expect(messages()).toEqual([]);
    expect(sizes()).toContain('3 variants');
  });

  it('keeps a piece that is not a number, and says so', async () => {
    const draft = await show('pitch');
    await choose('List');
    await typeOn('eighty ');
    expect(draft.list).toEqual(['70', 'eighty']);
    expect(messages()).toEqual(['Pitch must be a number from 10 to 500 mm; “eighty” was given.']);
  });
});

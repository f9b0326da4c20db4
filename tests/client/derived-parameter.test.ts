import { defineComponent, h, nextTick } from 'vue';
import { afterEach, describe, expect, it } from 'vitest';
import { findKind } from '@shared/engine/index.ts';
import type { DetailKind } from '@shared/engine/types.ts';
import { newDraft } from '../../src/components/family-editor/draft.ts';
import FamilyForm from '../../src/components/family-editor/FamilyForm.vue';
import {
  useFamilyForm,
  type FamilyForm as Form,
} from '../../src/components/family-editor/use-family-form.ts';
import { useCatalogueStore } from '../../src/stores/catalogue.ts';
import { mountInApp } from '../support/client/mount.ts';
import { catalogue } from './support/catalogue.ts';
import { buttonNamed, fieldLabelled, labelled, messages, radio } from './queries.ts';

const kind = findKind('gusset-plate') as DetailKind;
const settings = { increment: 1, factors: { gammaM0: 1, gammaM1: 1, gammaM2: 1.25 } };
let unmount: (() => void) | undefined;
afterEach(() => unmount?.());

/** The whole form of a new gusset family, with the catalogue at hand. */
async function show(): Promise<Form> {
  let form: Form | undefined;
  const whole = defineComponent({
    setup() {
      useCatalogueStore().catalogue = catalogue;
      const own = (form = useFamilyForm(newDraft(kind, 'en-1993-1-8-2005', settings)));
      return () =>
        h(FamilyForm, {
          modelValue: own.draft,
          kind,
          isNew: true,
          catalogue: useCatalogueStore().catalogue,
          faults: own.faults.value,
        });
    },
  });
  const wrapper = await mountInApp(whole);
  unmount = () => wrapper.unmount();
  return form!;
}

function area(label: string): HTMLTextAreaElement {
  const named = [...document.querySelectorAll('label')].find((one) => one.textContent?.trim() === label);
  const found = named && document.getElementById(named.htmlFor);
  if (!(found instanceof HTMLTextAreaElement)) throw new Error(`No expression is labelled "${label}"`);
  return found;
}
async function type(label: string, text: string): Promise<void> {
  const field = area(label);
  field.focus();
  field.value = text;
  field.setSelectionRange(text.length, text.length);
  field.dispatchEvent(new Event('input', { bubbles: true }));
  await settled();
}
async function press(label: string, key: string, more: KeyboardEventInit = {}): Promise<KeyboardEvent> {
  const event = new KeyboardEvent('keydown', { key, bubbles: true, cancelable: true, ...more });
  area(label).dispatchEvent(event);
  await settled();
  return event;
}
/** The preview is worked out in the next frame. */
async function settled(): Promise<void> {
  await nextTick();
  await new Promise((resolve) => requestAnimationFrame(resolve));
  await nextTick();
}
async function choose(parameter: string, mode: string): Promise<void> {
  const input = radio(parameter, mode);
  input.checked = true;
  input.dispatchEvent(new Event('change', { bubbles: true }));
  await settled();
}
const root = (label: string) => area(label).closest('.expression')!;
const said = (label: string) => root(label).querySelector('.said')!.textContent!.replace(/\s+/g, ' ').trim();
const marked = (label: string) => [...root(label).querySelectorAll('.mark')].map((one) => one.textContent);
const offered = (label: string) =>
  [...root(label).querySelectorAll('[role=option] code')].map((one) => one.textContent);

describe('a derived parameter', () => {
  it('starts from the value it had, and shows its value for the sample variant with its unit', async () => {
    const form = await show();
    await choose('Pitch', 'Derived');
    expect(area('Pitch =').value).toBe('70');
    expect(root('Pitch =').querySelector('.unit')?.textContent).toBe('mm');
    // M20: 3 × 20 = 60.
    await type('Pitch =', '3 * bolt_d');
    expect(said('Pitch =')).toBe('= 60 mm in the sample variant');
    expect(form.read.value.definition?.parameters.pitch).toEqual({
      mode: 'derived',
      expression: '3 * bolt_d',
    });
    expect(form.counts.value.variants).toBe(1);
  });

  it('marks the characters at fault, says what is meant, and cannot be saved', async () => {
    const form = await show();
    await choose('Pitch', 'Derived');
    await type('Pitch =', '3 * bolt_dd + 5');
    expect(marked('Pitch =')).toEqual(['bolt_dd']);
    expect(root('Pitch =').querySelector('.mirror')!.textContent).toBe('3 * bolt_dd + 5');
    expect(said('Pitch =')).toContain('did you mean bolt_d?');
    expect(area('Pitch =').getAttribute('aria-invalid')).toBe('true');
    expect(form.read.value.definition).toBeNull();
    await type('Pitch =', '');
    expect(said('Pitch =')).toBe('Pitch needs an expression, e.g. 2 * bolt_d.');
  });

  it('says why the sample variant has no value', async () => {
    await show();
    await choose('Pitch', 'Derived');
    fieldLabelled('Rows of bolts', '2');
    await type('Pitch =', '140 / (rows - 2)');
    expect(said('Pitch =')).toBe('Pitch = 140 / (rows - 2) has no value: division by 0 in 140 / (rows - 2).');
  });

  it('names a circle', async () => {
    await show();
    await choose('Pitch', 'Derived');
    await choose('Weld line to the first row', 'Derived');
    await type('Pitch =', 'first_row');
    await type('Weld line to the first row =', 'pitch');
    expect(said('Pitch =')).toContain('pitch → first_row → pitch');
  });

  it('offers names and functions by keyboard', async () => {
    await show();
    await choose('Pitch', 'Derived');
    await type('Pitch =', '3 * bolt_');
    expect(offered('Pitch =')).toContain('bolt_d');
    const field = area('Pitch =');
    expect(field.getAttribute('aria-expanded')).toBe('true');
    const place = offered('Pitch =').indexOf('bolt_d');
    for (let step = 0; step < place; step++) await press('Pitch =', 'ArrowDown');
    const option = document.getElementById(field.getAttribute('aria-activedescendant')!);
    expect(option?.getAttribute('aria-selected')).toBe('true');
    expect(option?.textContent).toContain('bolt_d');
    const enter = await press('Pitch =', 'Enter');
    expect(enter.defaultPrevented).toBe(true);
    expect(field.value).toBe('3 * bolt_d');
    expect(offered('Pitch =')).toEqual([]);
    await type('Pitch =', 'ce');
    await press('Pitch =', 'Escape');
    expect(offered('Pitch =')).toEqual([]);
    await press('Pitch =', ' ', { ctrlKey: true });
    expect(offered('Pitch =')[0]).toBe('ceil(a) or ceil(a, step)');
    // Tab goes on to the next field; it never writes.
    expect((await press('Pitch =', 'Tab')).defaultPrevented).toBe(false);
    expect(area('Pitch =').value).toBe('ce');
    // A parameter is not offered to itself.
    await type('Pitch =', 'pit');
    expect(offered('Pitch =')).not.toContain('pitch');
  });
});

describe('rules of a family', () => {
  it('are added, told of the sample variant, and stored with the definition', async () => {
    const form = await show();
    expect(form.read.value.definition).not.toHaveProperty('rules');
    buttonNamed('Add a rule').click();
    await settled();
    expect(said('Rule 1 holds where')).toContain('Rule 1 needs a comparison');
    await type('Rule 1 holds where', 'pitch >= 2.5 * bolt_d');
    fieldLabelled('Message of rule 1', 'Pitch below two and a half diameters');
    await settled();
    // 70 against 2.5 × 20 = 50.
    expect(said('Rule 1 holds where')).toBe('Holds for the sample variant.');
    expect(form.read.value.definition?.rules).toEqual([
      { expression: 'pitch >= 2.5 * bolt_d', message: 'Pitch below two and a half diameters' },
    ]);
    fieldLabelled('Pitch', '45');
    await settled();
    expect(said('Rule 1 holds where')).toBe(
      'Not so in the sample variant: pitch >= 2.5 * bolt_d does not hold: 45 against 50.',
    );
    const outcome = form.live.outcome.value;
    expect(outcome?.status).toBe('not-permitted');
    buttonNamed('Remove').click();
    await settled();
    expect(form.read.value.definition).not.toHaveProperty('rules');
  });

  it('need a message', async () => {
    await show();
    buttonNamed('Add a rule').click();
    await settled();
    expect(labelled('Message of rule 1').value).toBe('');
    expect(messages().join(' ')).toContain('Rule 1 needs a message of 3 to 160 characters');
  });
});

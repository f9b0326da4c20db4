/* Things of a page, found as a person finds them: by label, role and name. */

const words = (element: Element) => (element.textContent ?? '').replace(/\s+/g, ' ').trim();

/** The input that a label names. */
export function labelled(label: string): HTMLInputElement {
  const named = [...document.querySelectorAll('label')].find((one) => words(one) === label && one.htmlFor);
  const input = named
    ? document.getElementById(named.htmlFor)
    : document.querySelector(`[aria-label="${label}"]`);
  if (!(input instanceof HTMLInputElement)) throw new Error(`No field is labelled "${label}"`);
  return input;
}

/** Types into the field that a label names. */
export function fieldLabelled(label: string, text: string): void {
  const input = labelled(label);
  input.value = text;
  input.dispatchEvent(new Event('input', { bubbles: true }));
}

/** The button whose words begin so. */
export function buttonNamed(name: string): HTMLButtonElement {
  const found = [...document.querySelectorAll('button')].find((one) => words(one).startsWith(name));
  if (!found) throw new Error(`No button is named "${name}"`);
  return found;
}

/** The radio inside a label with these words, inside a group with that legend. */
export function radio(legend: string, name: string): HTMLInputElement {
  const group = [...document.querySelectorAll('fieldset')].find((one) =>
    words(one.querySelector('legend') ?? one).startsWith(legend),
  );
  const label = [...(group?.querySelectorAll('label') ?? [])].find((one) => words(one) === name);
  const input = label?.querySelector('input');
  if (!input) throw new Error(`No choice "${name}" in "${legend}"`);
  return input;
}

/** The words of every message under the fields. */
export const messages = (): string[] =>
  [...document.querySelectorAll('.v-messages__message')].map(words).filter((text) => text !== '');

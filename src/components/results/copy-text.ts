/** Puts text on the clipboard; over plain HTTP, where browsers hide the clipboard, by way of a selected field. */
export async function copyText(text: string): Promise<void> {
  if (window.isSecureContext) return navigator.clipboard.writeText(text);
  const held = document.activeElement;
  const field = document.createElement('textarea');
  field.value = text;
  field.className = 'bm-hidden';
  document.body.append(field);
  field.select();
  const copied = document.execCommand('copy');
  field.remove();
  if (held instanceof HTMLElement) held.focus({ preventScroll: true });
  if (!copied) throw new Error('This browser did not let the page use the clipboard.');
}

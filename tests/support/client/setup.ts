import { config } from '@vue/test-utils';
import { afterEach, vi } from 'vitest';

/* What browsers have, Vuetify asks for, and the test document lacks. */
class NeverResized implements ResizeObserver {
  observe(): void {}
  unobserve(): void {}
  disconnect(): void {}
}

globalThis.ResizeObserver ??= NeverResized;
window.visualViewport ??= Object.assign(new EventTarget(), {
  width: 1440,
  height: 900,
  offsetLeft: 0,
  offsetTop: 0,
  pageLeft: 0,
  pageTop: 0,
  scale: 1,
  onresize: null,
  onscroll: null,
  onscrollend: null,
}) as unknown as VisualViewport;

// Drop-downs and dialogs are found in the document by role, so they are really moved there.
config.global.stubs = { transition: true, 'transition-group': true };

afterEach(() => {
  document.body.innerHTML = '';
  vi.restoreAllMocks();
});

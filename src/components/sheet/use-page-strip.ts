import { onBeforeUnmount, onMounted, watch, type Ref } from 'vue';

/** CSS text in quotes. */
const quoted = (text: string) =>
  `"${text.replace(/["\\\n]/g, (sign) => `\\${sign.charCodeAt(0).toString(16)} `)}"`;

/** The margin at the foot of every printed page: what the sheet is of, and the page's number. */
export const pageStripRule = (text: string): string =>
  `@page { @bottom-left { content: ${quoted(text)}; font: 8.5pt Lato, sans-serif; } }`;

/** Prints a line at the foot of every page while the component is shown. */
export function usePageStrip(text: Ref<string>): void {
  const style = document.createElement('style');
  watch(text, (line) => (style.textContent = pageStripRule(line)), { immediate: true });
  onMounted(() => document.head.append(style));
  onBeforeUnmount(() => style.remove());
}

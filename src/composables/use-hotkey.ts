import { onBeforeUnmount, onMounted } from 'vue';

const typing = (target: EventTarget | null) =>
  target instanceof HTMLElement &&
  (target.isContentEditable || /^(INPUT|TEXTAREA|SELECT)$/.test(target.tagName));

/** Listens for one key while the component is shown. A plain key is not taken from a person who is typing. */
export function useHotkey(key: string, act: () => void, { control = false } = {}): void {
  const listen = (event: KeyboardEvent) => {
    if (event.key.toLowerCase() !== key || event.altKey) return;
    if ((event.ctrlKey || event.metaKey) !== control) return;
    if (!control && typing(event.target)) return;
    event.preventDefault();
    act();
  };
  onMounted(() => window.addEventListener('keydown', listen));
  onBeforeUnmount(() => window.removeEventListener('keydown', listen));
}

import { ref, watch } from 'vue';
import { useTheme } from 'vuetify';

export type Appearance = 'system' | 'light' | 'dark';
const KEY = 'backmark.appearance';
const APPEARANCES: readonly Appearance[] = ['system', 'light', 'dark'];

/** What this browser last chose; a browser that forbids storage follows the system. */
export function savedAppearance(): Appearance {
  try {
    const saved = localStorage.getItem(KEY);
    return APPEARANCES.find((one) => one === saved) ?? 'system';
  } catch {
    return 'system';
  }
}

function save(appearance: Appearance): void {
  try {
    localStorage.setItem(KEY, appearance);
  } catch {
    // A browser that forbids storage keeps the choice until the page is left.
  }
}

const appearance = ref<Appearance>(savedAppearance());

/** Light, dark, or as the system says; kept in this browser. */
export function useAppearance() {
  const theme = useTheme();
  watch(appearance, (chosen) => {
    save(chosen);
    void theme.change(chosen);
  });
  const next = () => {
    const place = APPEARANCES.indexOf(appearance.value);
    appearance.value = APPEARANCES[(place + 1) % APPEARANCES.length] ?? 'system';
  };
  return { appearance, next };
}

import { defineStore } from 'pinia';
import { shallowRef } from 'vue';
import { fetchSettings, type Settings } from '../api/settings.ts';

/** The firm's settings as screens need them; asked for once, and taken anew when they are saved. */
export const useSettingsStore = defineStore('settings', () => {
  const settings = shallowRef<Settings | null>(null);
  let asked: Promise<Settings> | undefined;

  function load(): Promise<Settings> {
    asked ??= fetchSettings()
      .then((answer) => (settings.value = answer))
      .catch((error: unknown) => {
        asked = undefined;
        throw error;
      });
    return asked;
  }

  function take(saved: Settings): void {
    settings.value = saved;
    asked = Promise.resolve(saved);
  }

  return { settings, load, take };
});

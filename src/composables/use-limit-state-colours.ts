import { computed, toValue, type MaybeRefOrGetter } from 'vue';
import { useTheme } from 'vuetify';
import { limitStateColours } from '../styles/limit-states.ts';

/** The colours of a kind's limit states in the theme that is shown. */
export function useLimitStateColours(
  limitStates: MaybeRefOrGetter<readonly { readonly id: string; readonly part: string }[]>,
) {
  const theme = useTheme();
  return computed(() => limitStateColours(toValue(limitStates), theme.current.value.dark));
}

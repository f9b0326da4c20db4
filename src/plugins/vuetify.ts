import 'vuetify/styles/layers';
import 'vuetify/styles/core';
import 'vuetify/styles/utilities';
import { createVuetify } from 'vuetify';
import { aliases, mdi } from 'vuetify/iconsets/mdi-svg';
import { savedAppearance } from '../composables/use-appearance.ts';
import { componentDefaults } from './defaults.ts';
import { darkColors, lightColors } from './tokens.ts';

const variables = {
  'border-opacity': 1,
  'high-emphasis-opacity': 1,
  'medium-emphasis-opacity': 0.8,
  'disabled-opacity': 0.5,
};

/** Vuetify with our theme, our defaults and only the icons that are imported. */
export const createAppVuetify = () =>
  createVuetify({
    icons: { defaultSet: 'mdi', aliases, sets: { mdi } },
    defaults: componentDefaults,
    display: { mobileBreakpoint: 'md' },
    theme: {
      defaultTheme: savedAppearance(),
      utilities: true,
      themes: {
        light: {
          dark: false,
          colors: lightColors,
          variables: { ...variables, 'border-color': lightColors.hairline },
        },
        dark: {
          dark: true,
          colors: darkColors,
          variables: { ...variables, 'border-color': darkColors.hairline },
        },
      },
    },
  });

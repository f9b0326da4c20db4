const field = {
  variant: 'outlined',
  density: 'compact',
  color: 'secondary',
  hideDetails: 'auto',
  rounded: 'sm',
} as const;
const choice = { density: 'compact', color: 'primary', hideDetails: 'auto' } as const;

/** How every Vuetify component of the program looks unless it says otherwise: flat, dense, ruled by hairlines. */
export const componentDefaults = {
  global: { ripple: false, elevation: 0 },
  VAlert: { variant: 'tonal', density: 'compact', rounded: 'sm', border: 'start' },
  VAutocomplete: field,
  VBtn: { variant: 'flat', color: 'primary', rounded: 'sm', height: 36 },
  VBtnToggle: {
    density: 'compact',
    rounded: 'sm',
    divided: true,
    border: true,
    color: 'primary',
    VBtn: { color: undefined, variant: 'text' },
  },
  VCard: { variant: 'flat', border: true, rounded: 'sm' },
  VCheckbox: choice,
  VChip: { variant: 'outlined', rounded: 'sm', size: 'small', label: true },
  VCombobox: field,
  VDataTable: { density: 'compact', hover: true },
  VDialog: { maxWidth: 560, scrollable: true },
  VFileInput: field,
  VList: { density: 'compact' },
  VMenu: { offset: 4 },
  VProgressLinear: { color: 'primary', rounded: false },
  VRadioGroup: choice,
  VSelect: field,
  VSheet: { rounded: 'sm' },
  VSwitch: { ...choice, inset: true },
  VTable: { density: 'compact' },
  VTabs: { color: 'primary', density: 'compact' },
  VTextarea: { ...field, rows: 3, autoGrow: true },
  VTextField: field,
  VTooltip: { location: 'top', openDelay: 300 },
} as const;

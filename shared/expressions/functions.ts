/** A function that expressions offer, as the list in the editor and the documentation show it. */
export interface FunctionInfo {
  readonly name: string;
  readonly form: string;
  readonly meaning: string;
  readonly example: string;
  readonly least: number;
  readonly most: number;
}

/** Every function. Their names are reserved: no parameter may have one. */
export const functions: readonly FunctionInfo[] = [
  {
    name: 'min',
    form: 'min(a, b, …)',
    meaning: 'The least of two or more numbers.',
    example: 'min(gusset_end_distance, gusset_edge_distance)',
    least: 2,
    most: 20,
  },
  {
    name: 'max',
    form: 'max(a, b, …)',
    meaning: 'The greatest of two or more numbers.',
    example: 'max(6, plate_thickness - 2)',
    least: 2,
    most: 20,
  },
  {
    name: 'round',
    form: 'round(a) or round(a, step)',
    meaning: 'To the nearest whole number, or multiple of a step; halves away from zero.',
    example: 'round(1.2 * hole_d)',
    least: 1,
    most: 2,
  },
  {
    name: 'ceil',
    form: 'ceil(a) or ceil(a, step)',
    meaning: 'Up to a whole number, or to a multiple of a step.',
    example: 'ceil(2.5 * bolt_d, 5)',
    least: 1,
    most: 2,
  },
  {
    name: 'floor',
    form: 'floor(a) or floor(a, step)',
    meaning: 'Down to a whole number, or to a multiple of a step.',
    example: 'floor(weld_length / pitch)',
    least: 1,
    most: 2,
  },
  {
    name: 'abs',
    form: 'abs(a)',
    meaning: 'The number without its sign.',
    example: 'abs(work_line_offset)',
    least: 1,
    most: 1,
  },
  {
    name: 'sqrt',
    form: 'sqrt(a)',
    meaning: 'The square root of a number that is not below 0.',
    example: 'sqrt(pitch^2 + gauge^2)',
    least: 1,
    most: 1,
  },
  {
    name: 'if',
    form: 'if(condition, then, otherwise)',
    meaning:
      'The second where the condition holds, the third where it does not; only that one is worked out.',
    example: 'if(plate_thickness > 16, 8, 6)',
    least: 3,
    most: 3,
  },
];

export const findFunction = (name: string): FunctionInfo | undefined =>
  functions.find((one) => one.name === name);

/** The operators, those that bind most first; in one row, from left to right, powers from right to left. */
export const operators: readonly { readonly signs: string; readonly meaning: string }[] = [
  { signs: '^', meaning: 'Power; 2^3^2 is 2^9, and -2^2 is -4.' },
  { signs: '-a', meaning: 'Sign.' },
  { signs: '* /', meaning: 'Product and quotient.' },
  { signs: '+ -', meaning: 'Sum and difference.' },
  {
    signs: '< <= > >= = <>',
    meaning: 'Comparison of two numbers, or (= and <>) with a word in quotes, e.g. outline = "tapered".',
  },
  { signs: 'not', meaning: 'Holds where the comparison after it does not.' },
  { signs: 'and', meaning: 'Both hold.' },
  { signs: 'or', meaning: 'At least one holds.' },
];

/** Words that are no names. */
export const keywords = ['and', 'or', 'not'] as const;

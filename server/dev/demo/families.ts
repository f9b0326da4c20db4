import type { Definition, ParameterSetting } from '@shared/contracts/definition.ts';
import type { ParameterValue } from '@shared/engine/index.ts';

/** What becomes of a demo family. */
export type Fate = 'draft' | 'swept' | 'in-check' | 'checked' | 'published' | 'locked' | 'withdrawn';

export interface DemoFamily {
  readonly code: string;
  readonly title: string;
  readonly definition: Definition;
  readonly fate: Fate;
  /** A later revision that takes the place of the first. */
  readonly next?: { readonly definition: Definition; readonly fate: Fate };
}

const fixed = (value: ParameterValue): ParameterSetting => ({ mode: 'fixed', value });
const derived = (expression: string): ParameterSetting => ({ mode: 'derived', expression });
const list = (...values: ParameterValue[]): ParameterSetting => ({ mode: 'list', values });
const range = (from: number, to: number, step: number): ParameterSetting => ({
  mode: 'range',
  from,
  to,
  step,
});

const common = {
  schema: 1,
  kind: 'gusset-plate',
  increment: 1,
  factors: { gammaM0: 1, gammaM1: 1, gammaM2: 1.25 },
} as const;
const sans = { ...common, basis: 'sans-10162-1-2011' } as const;
const en = { ...common, basis: 'en-1993-1-8-2005' } as const;

const twinAngles: Definition = {
  ...sans,
  parameters: {
    plate_thickness: list(10, 12),
    plate_steel: fixed('S355JR'),
    member_steel: fixed('S355JR'),
    weld_length: fixed(300),
    weld_leg: list(6, 8),
    bolt_size: fixed('M20'),
    bolt_grade: fixed('8.8'),
    rows: range(2, 4, 1),
    pitch: fixed(70),
    first_row: fixed(170),
    brace: fixed('back_to_back'),
    section: list('L80x80x8', 'L90x90x8', 'L100x100x10'),
  },
  angles: { mode: 'range', from: -60, to: 60, step: 5 },
  senses: ['tension', 'compression'],
};

/** The families of Harrow Quay Structural, an invented firm, in every state of life. */
export const demoFamilies: readonly DemoFamily[] = [
  {
    code: 'GP-01',
    title: 'Gusset, twin angles back to back, M20',
    definition: twinAngles,
    fate: 'locked',
    next: {
      definition: { ...twinAngles, parameters: { ...twinAngles.parameters, pitch: fixed(65) } },
      fate: 'published',
    },
  },
  {
    code: 'GP-02',
    title: 'Gusset, twin angles back to back, M24',
    definition: {
      ...en,
      parameters: {
        plate_thickness: list(12, 15),
        weld_length: fixed(400),
        weld_leg: list(6, 8, 10),
        bolt_size: list('M20', 'M24'),
        bolt_grade: fixed('8.8'),
        rows: range(2, 5, 1),
        pitch: fixed(75),
        gusset_end_distance: fixed(55),
        member_end_distance: fixed(50),
        first_row: fixed(200),
        brace: fixed('back_to_back'),
        section: list('L100x100x10', 'L120x120x12'),
      },
      angles: { mode: 'range', from: -75, to: 75, step: 5 },
      senses: ['tension', 'compression'],
    },
    fate: 'locked',
  },
  {
    code: 'GP-03',
    title: 'Gusset, single angle, light bracing',
    definition: {
      ...sans,
      parameters: {
        plate_thickness: list(8, 10),
        plate_steel: fixed('S275JR'),
        member_steel: fixed('S275JR'),
        weld_length: fixed(220),
        weld_leg: list(5, 6),
        bolt_size: list('M16', 'M20'),
        bolt_grade: fixed('8.8'),
        rows: list(2, 3),
        pitch: fixed(60),
        gusset_end_distance: fixed(40),
        gusset_edge_distance: fixed(40),
        member_end_distance: fixed(40),
        first_row: fixed(130),
        brace: fixed('single'),
        section: list('L70x70x7', 'L80x80x8'),
      },
      angles: { mode: 'range', from: -60, to: 60, step: 10 },
      senses: ['tension'],
    },
    fate: 'withdrawn',
  },
  {
    code: 'GP-04',
    title: 'Gusset, flat bar hanger',
    definition: {
      ...en,
      parameters: {
        plate_thickness: list(10, 12, 15),
        weld_length: fixed(260),
        weld_leg: fixed(6),
        bolt_size: list('M16', 'M20', 'M24'),
        rows: range(2, 4, 1),
        pitch: fixed(75),
        gusset_end_distance: fixed(50),
        member_end_distance: fixed(50),
        first_row: fixed(150),
        brace: fixed('flat'),
        section: list('FL100x12', 'FL120x12'),
      },
      angles: { mode: 'range', from: -45, to: 45, step: 5 },
      senses: ['tension'],
    },
    fate: 'published',
  },
  {
    code: 'GP-05',
    title: 'Gusset, two angles in star',
    definition: {
      ...en,
      parameters: {
        plate_thickness: list(12, 15, 20),
        weld_length: fixed(420),
        weld_leg: list(8, 10),
        bolt_size: fixed('M20'),
        rows: range(2, 5, 1),
        lines: fixed(2),
        pitch: fixed(70),
        gauge: fixed(120),
        first_row: fixed(260),
        brace: fixed('star'),
        section: list('L90x90x9', 'L100x100x10'),
      },
      angles: { mode: 'range', from: -60, to: 60, step: 5 },
      senses: ['tension', 'compression'],
    },
    fate: 'checked',
  },
  {
    code: 'GP-06',
    title: 'Gusset, heavy bracing, two lines of M24',
    definition: {
      ...sans,
      parameters: {
        plate_thickness: list(16, 20),
        plate_steel: fixed('S355JR'),
        member_steel: fixed('S355JR'),
        weld_length: list(450, 550),
        weld_leg: list(8, 10),
        bolt_size: fixed('M24'),
        bolt_grade: list('8.8', '10.9'),
        rows: range(2, 5, 1),
        lines: fixed(2),
        pitch: fixed(75),
        gauge: fixed(65),
        gusset_end_distance: fixed(55),
        gusset_edge_distance: fixed(60),
        member_end_distance: fixed(50),
        first_row: fixed(260),
        brace: fixed('back_to_back'),
        section: fixed('L150x150x15'),
        member_backmark: fixed(55),
      },
      angles: { mode: 'range', from: -60, to: 60, step: 5 },
      senses: ['tension', 'compression'],
    },
    fate: 'in-check',
  },
  {
    code: 'GP-07',
    title: 'Gusset, square-cut plate, twin angles',
    definition: {
      ...sans,
      parameters: {
        outline: fixed('rectangular'),
        projection: fixed(420),
        plate_thickness: list(10, 12),
        plate_steel: fixed('S355JR'),
        weld_length: list(380, 450),
        weld_leg: fixed(6),
        bolt_size: fixed('M20'),
        rows: list(2, 3),
        pitch: fixed(70),
        first_row: fixed(180),
        section: list('L80x80x8', 'L100x100x10'),
      },
      angles: { mode: 'range', from: -45, to: 45, step: 5 },
      senses: ['tension'],
    },
    fate: 'swept',
  },
  {
    code: 'GP-08',
    title: 'Gusset, boat-shed roof bracing',
    definition: {
      ...en,
      parameters: {
        plate_thickness: list(8, 10, 12),
        plate_steel: fixed('S275'),
        weld_length: fixed(240),
        weld_leg: fixed(6),
        bolt_size: list('M16', 'M20'),
        rows: list(2, 3),
        pitch: derived('ceil(3 * bolt_d, 5)'),
        gusset_end_distance: derived('ceil(2 * bolt_d, 5)'),
        first_row: fixed(140),
        section: list('L70x70x7', 'L80x80x8'),
      },
      rules: [
        {
          expression: 'section_long_leg >= 4 * bolt_d',
          message: 'The leg is too narrow for the bolt and its washer',
        },
      ],
      angles: { mode: 'range', from: -60, to: 60, step: 10 },
      senses: ['tension'],
    },
    fate: 'draft',
  },
];

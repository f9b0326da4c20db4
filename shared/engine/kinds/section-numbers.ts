import type { Section, SectionShape } from '../types.ts';

/** A dimension of a section under a name of its own. */
export interface SectionNumber {
  readonly suffix: string;
  readonly meaning: string;
  readonly unit: 'mm' | 'mm²';
  readonly shapes: readonly SectionShape[];
  /** Null in a shape that has no such dimension. */
  readonly read: (section: Section) => number | null;
}

/** The dimensions that expressions may use: `beam_section_depth` is the depth of the section chosen as `beam_section`. */
export const sectionNumbers: readonly SectionNumber[] = [
  {
    suffix: 'depth',
    meaning: 'depth',
    unit: 'mm',
    shapes: ['i'],
    read: (section) => (section.shape === 'i' ? section.depth : null),
  },
  {
    suffix: 'width',
    meaning: 'width',
    unit: 'mm',
    shapes: ['i', 'flat'],
    read: (section) => (section.shape === 'angle' ? null : section.width),
  },
  {
    suffix: 'web',
    meaning: 'thickness of the web',
    unit: 'mm',
    shapes: ['i'],
    read: (section) => (section.shape === 'i' ? section.webThickness : null),
  },
  {
    suffix: 'flange',
    meaning: 'thickness of the flange',
    unit: 'mm',
    shapes: ['i'],
    read: (section) => (section.shape === 'i' ? section.flangeThickness : null),
  },
  {
    suffix: 'long_leg',
    meaning: 'long leg',
    unit: 'mm',
    shapes: ['angle'],
    read: (section) => (section.shape === 'angle' ? section.longLeg : null),
  },
  {
    suffix: 'short_leg',
    meaning: 'short leg',
    unit: 'mm',
    shapes: ['angle'],
    read: (section) => (section.shape === 'angle' ? section.shortLeg : null),
  },
  {
    suffix: 'thickness',
    meaning: 'thickness',
    unit: 'mm',
    shapes: ['angle', 'flat'],
    read: (section) => (section.shape === 'i' ? null : section.thickness),
  },
  {
    suffix: 'root',
    meaning: 'root radius',
    unit: 'mm',
    shapes: ['i', 'angle'],
    read: (section) => (section.shape === 'flat' ? null : section.rootRadius),
  },
  {
    suffix: 'area',
    meaning: 'area',
    unit: 'mm²',
    shapes: ['i', 'angle', 'flat'],
    read: ({ area }) => area,
  },
];

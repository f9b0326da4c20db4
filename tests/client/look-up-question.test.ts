import { describe, expect, it } from 'vitest';
import { barOf, percent, printedUnrounded } from '../../src/components/lookup/answer.ts';
import {
  angleFault,
  fittingQuestion,
  readQuestion,
  requestOf,
  writeQuestion,
  type LookUpDetail,
} from '../../src/components/lookup/question.ts';

const detail: LookUpDetail = {
  familyId: 1,
  code: 'GP-01',
  title: 'Light bracing gussets',
  revisionId: 11,
  letter: 'B',
  state: 'published',
  shortHash: 'a41c07f3d29b',
  basis: 'sans-10162-1-2011',
  senses: ['tension'],
  angleMinimum: -80,
  angleMaximum: 80,
  choices: [{ name: 'bolt_size', label: 'Bolt size', symbol: 'd', unit: '', values: ['M20', 'M24'] }],
  fixed: [],
  derived: [],
};

describe('the question in the address', () => {
  it('comes back as it was written', () => {
    const question = {
      code: 'GP-01',
      angle: -12.5,
      sense: 'compression' as const,
      load: 320,
      places: { bolt_size: 1 },
    };
    expect(readQuestion(writeQuestion(question) as Record<string, string>)).toEqual(question);
  });

  it('has no load when the load is not a positive number', () => {
    expect(readQuestion({ load: '-5' }).load).toBeNull();
    expect(readQuestion({ load: 'much' }).load).toBeNull();
  });

  it('is made to fit the detail: its senses, its sizes', () => {
    const question = fittingQuestion(
      readQuestion({ detail: 'GP-01', sense: 'compression', sizes: 'bolt_size:9,pitch:1' }),
      detail,
    );
    expect(question).toMatchObject({ sense: 'tension', places: { bolt_size: 1 } });
  });
});

describe('the request', () => {
  const question = fittingQuestion(readQuestion({ detail: 'GP-01', angle: '30', load: '250' }), detail);

  it('names the revision, one value a size, angle, sense and load', () => {
    expect(requestOf(question, detail)).toEqual({
      revisionId: 11,
      choices: { bolt_size: 'M20' },
      angle: 30,
      sense: 'tension',
      load: 250,
    });
  });

  it('is not made for an angle that the detail does not cover', () => {
    expect(requestOf({ ...question, angle: 81 }, detail)).toBeNull();
    expect(requestOf({ ...question, angle: NaN }, detail)).toBeNull();
    expect(angleFault(81, detail)).toBe('From −80° to 80°, from the normal of the face.');
    expect(angleFault(-80, detail)).toBeNull();
  });
});

describe('what is printed errs low', () => {
  it('cuts a capacity and raises a utilisation', () => {
    expect(printedUnrounded(340.099)).toBe('340.09');
    expect(percent(1.00001)).toBe('100.1 %');
    expect(percent(1)).toBe('100.0 %');
  });

  it('marks the capacity on the bar, wherever the load ends', () => {
    expect(barOf(0.5)).toEqual({ filled: 50, limit: 100 });
    expect(barOf(2)).toEqual({ filled: 100, limit: 50 });
  });
});

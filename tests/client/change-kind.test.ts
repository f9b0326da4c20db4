import { expect, it } from 'vitest';
import { findKind } from '@shared/engine/index.ts';
import { isOfOtherKind, ofKind } from '../../src/components/family-editor/change-kind.ts';
import { newDraft } from '../../src/components/family-editor/draft.ts';

const gusset = findKind('gusset-plate')!;
const fin = findKind('fin-plate')!;
const settings = { increment: 2, factors: { gammaM0: 1, gammaM1: 1.1, gammaM2: 1.3 } };

it('another kind comes with its own defaults, and keeps what was changed by hand', () => {
  const draft = newDraft(gusset, 'en-1993-1-8-2005', settings);
  draft.code = 'FP-09';
  draft.parameters.bolt_size!.fixed = 'M24';
  const other = ofKind({ ...draft, kind: 'fin-plate' }, gusset, fin);
  expect(other.kind).toBe('fin-plate');
  expect(isOfOtherKind(draft, fin)).toBe(true);
  expect(isOfOtherKind(other, fin)).toBe(false);
  // The fin plate's own plate is 10 mm; the gusset's 12 mm was never touched.
  expect(other.parameters.plate_thickness?.fixed).toBe('10');
  expect(other.parameters.bolt_size?.fixed).toBe('M24');
  expect(other.senses).toEqual([...fin.senses]);
  expect(other.angles.range).toMatchObject({ from: '-90', to: '90' });
  expect(other).toMatchObject({ code: 'FP-09', increment: 2, factors: { gammaM2: '1.3' } });
});

import type { ResultAxes } from '@shared/contracts/revisions.ts';
import { flushPromises } from '@vue/test-utils';
import { beforeEach, describe, expect, it, vi } from 'vitest';
import { issuedRevisions } from '../../src/components/exports/issued.ts';
import {
  fittingPlan,
  requestOf,
  restOf,
  sizeOf,
  usualPlan,
} from '../../src/components/exports/table-plan.ts';
import TableForm from '../../src/components/exports/TableForm.vue';
import { dimensionsOf } from '../../src/components/results/dimensions.ts';
import { mountInApp } from '../support/client/mount.ts';
import { buttonNamed, fieldLabelled, labelled } from './queries.ts';
import { json } from './support/revisions.ts';

const axes: ResultAxes = {
  revisionId: 31,
  axes: [
    { name: 'plate_thickness', label: 'Plate thickness', symbol: 't', unit: 'mm', values: [10, 12, 16] },
    { name: 'bolt_size', label: 'Bolt size', symbol: 'd', unit: '', values: ['M20', 'M24'] },
  ],
  angles: [-30, 0, 30, 60],
  senses: ['tension', 'compression'],
  increment: 1,
  variants: 6,
  limitStates: [],
  rules: [],
  lowest: 100,
  highest: 400,
  rejectedCells: 0,
};
const dimensions = dimensionsOf(axes, 'gusset-plate');

describe('the plan of a table', () => {
  it('puts the sizes down and the angles across', () => {
    const plan = usualPlan(axes, dimensions);
    expect(plan).toMatchObject({ down: ['plate_thickness', 'bolt_size'], across: 'angle' });
    expect(sizeOf(plan, dimensions)).toEqual({ rows: 6, columns: 4, sheets: 1 });
  });

  it('makes a sheet for each value of what stands nowhere, unless that is held', () => {
    const plan = { ...usualPlan(axes, dimensions), down: ['bolt_size'] };
    expect(restOf(plan, dimensions).map(({ name }) => name)).toEqual(['plate_thickness']);
    expect(sizeOf(plan, dimensions)).toEqual({ rows: 2, columns: 4, sheets: 3 });
    const held = { ...plan, held: { plate_thickness: 2 } };
    expect(sizeOf(held, dimensions).sheets).toBe(1);
    expect(requestOf(held, axes, dimensions).held).toEqual({ plate_thickness: 16 });
  });

  it('holds the load angle nearest to 0 where it stands neither down nor across', () => {
    const plan = { ...usualPlan(axes, dimensions), down: ['plate_thickness'], across: 'bolt_size' };
    const fitting = fittingPlan(plan, axes);
    expect(requestOf(fitting, axes, dimensions).held).toEqual({ angle: 0 });
    expect(sizeOf(fitting, dimensions)).toEqual({ rows: 3, columns: 2, sheets: 1 });
    expect(fittingPlan(usualPlan(axes, dimensions), axes).held).toEqual({});
  });

  it('sends no held value for what stands down after all', () => {
    const plan = { ...usualPlan(axes, dimensions), held: { bolt_size: 1 } };
    expect(requestOf(plan, axes, dimensions).held).toEqual({});
  });
});

describe('the form of a table', () => {
  const fetched = vi.fn<typeof fetch>();
  beforeEach(() => {
    fetched.mockReset();
    vi.stubGlobal('fetch', fetched);
  });

  it('keeps what was typed when the server refuses, and names the fault at its field', async () => {
    const errors = [{ field: 'drawingNumber', message: 'HQ-114 is on the register already.' }];
    fetched.mockImplementation(() =>
      Promise.resolve(json(422, { type: 'x', title: 'Faults', status: 422, code: 'validation', errors })),
    );
    await mountInApp(TableForm, { props: { axes, kind: 'gusset-plate' } });
    fieldLabelled('Drawing number', ' HQ-114 ');
    buttonNamed('Make the workbook').click();
    await flushPromises();
    const sent = JSON.parse(String(fetched.mock.calls[0]?.[1]?.body));
    expect(sent).toEqual({
      revisionId: 31,
      format: 'xlsx',
      down: ['plate_thickness', 'bolt_size'],
      across: 'angle',
      held: {},
      sense: 'tension',
      drawingNumber: 'HQ-114',
      paper: 'A3',
    });
    expect(document.querySelector('.v-messages')?.closest('form')?.textContent).toContain(
      'HQ-114 is on the register',
    );
    expect(labelled('Drawing number').value).toBe(' HQ-114 ');
  });

  it('hands the file over under the name that the server gives it', async () => {
    const headers = { 'content-disposition': "attachment; filename*=UTF-8''GP-07%20A.xlsx" };
    fetched.mockImplementation(() => Promise.resolve(new Response('file', { status: 200, headers })));
    const saved: string[] = [];
    vi.spyOn(HTMLAnchorElement.prototype, 'click').mockImplementation(function (this: HTMLAnchorElement) {
      saved.push(this.download);
    });
    URL.createObjectURL = () => 'blob:test';
    const made = vi.fn();
    await mountInApp(TableForm, { props: { axes, kind: 'gusset-plate', onMade: made } });
    buttonNamed('Make the workbook').click();
    await flushPromises();
    expect(saved).toEqual(['GP-07 A.xlsx']);
    expect(made).toHaveBeenCalledOnce();
  });
});

describe('the revisions that a table can be made of', () => {
  const summary = (id: number, letter: string, state: 'locked' | 'superseded' | 'checked') => ({
    id,
    letter,
    state,
    basis: 'en-1993-1-8-2005',
    variants: 6,
    cells: 48,
    shortHash: 'a41c07f3d29b',
    author: { id: 1, name: 'Thandeka Marais' },
    updatedAt: '2026-11-20T10:00:00Z',
    publishedAt: '2026-11-20T10:00:00Z',
  });

  it('are the published ones, those in force first', () => {
    const revisions = [summary(2, 'A', 'superseded'), summary(4, '', 'checked'), summary(3, 'B', 'locked')];
    const can = { edit: false, startRevision: false };
    const base = { id: 7, code: 'GP-07', title: 'Bracing', kind: 'gusset-plate', lockVersion: 1, can };
    const issued = issuedRevisions([{ ...base, current: null, working: null, revisions }]);
    expect(issued.map(({ id, inForce }) => [id, inForce])).toEqual([
      [3, true],
      [2, false],
    ]);
  });
});

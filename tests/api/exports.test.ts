import { afterAll, beforeAll, beforeEach, describe, expect, test, vi } from 'vitest';
import type { z } from 'zod';
import type { exportListResponse } from '@shared/contracts/exports.ts';
import { CAUTIONS } from '@shared/wording/cautions.ts';
import { createHarness, type Agent, type Harness } from './harness.ts';
import { smallDefinition } from './support/definition.ts';
import { makeSwept, type Made } from './support/swept-revision.ts';
import { askForTable, firstColumn, problemIn, readWorkbook, rowUnder, sha256 } from './support/workbook.ts';

let harness: Harness;
let drafter: Agent;
let made: Made;

beforeAll(async () => {
  harness = await createHarness();
  made = await makeSwept(harness, { code: 'GP-01', title: '=HYPERLINK("x")' });
});
beforeEach(async () => {
  drafter = await harness.signedIn('drafter');
});
afterAll(() => harness.close());

const layout = { format: 'xlsx', down: ['plate_thickness', 'angle'], across: 'bolt_size', sense: 'tension' };
const ask = (changes: object = {}, of = made) =>
  askForTable(drafter, { revisionId: of.row.id, ...layout, ...changes });
const made200 = async (changes: object = {}, of = made) => {
  const answer = await ask(changes, of);
  expect(answer.status, (answer.body as Buffer).toString('utf8').slice(0, 500)).toBe(200);
  return { answer, bytes: answer.body as Buffer, workbook: await readWorkbook(answer.body as Buffer) };
};
const codes = () => made.laidOut.kind.limitStates.map(({ code }) => code);
const entries = async () => {
  const { body } = await drafter.get('/api/exports').expect(200);
  return (body as z.infer<typeof exportListResponse>).exports;
};

/** What a table must show for a stored cell. */
function shown(ordinal: number, sense: number, angle: number): [unknown, unknown] {
  const stored = made.stored(ordinal, sense, angle);
  const code = made.code(ordinal, sense, angle);
  return Number.isNaN(stored) ? ['n/p', 255 - code + 1] : [stored, codes()[code]];
}

describe('a table', () => {
  test('holds every stored cell of its sense, with what governs, and numbers the rejected ones', async () => {
    const { workbook } = await made200();
    expect(workbook.worksheets.map(({ name }) => name)).toEqual(['1 Table', 'Legend', 'Basis and cautions']);
    const sheet = workbook.worksheets[0]!;
    const first = rowUnder(sheet, 'Plate thickness t, mm');
    expect([3, 5].map((column) => sheet.getCell(first - 1, column).value)).toEqual(['M20', 'M24']);
    expect(sheet.getCell(first - 1, 2).value).toBe('Load angle θ, °');
    let rejected = 0;
    for (let row = 0; row < 18; row++) {
      const [plate, angle] = [Math.floor(row / 9), row % 9];
      expect(sheet.getCell(first + row, 1).value).toBe([10, 12][plate]);
      expect(sheet.getCell(first + row, 2).value).toBe(-80 + 20 * angle);
      for (let bolt = 0; bolt < 2; bolt++) {
        const cells = [3 + 2 * bolt, 4 + 2 * bolt].map((column) => sheet.getCell(first + row, column).value);
        expect(cells).toEqual(shown(plate * 2 + bolt, 0, angle));
        if (cells[0] !== 'n/p') continue;
        rejected++;
        const title = made.laidOut.kind.rules[(cells[1] as number) - 1]!.title;
        expect(firstColumn(sheet).some((text) => text.startsWith(`${cells[1] as number}  ${title}`))).toBe(
          true,
        );
      }
    }
    expect(rejected).toBeGreaterThan(0);
    expect(sheet.getCell(first + 4, 3).numFmt).toBe('0');
  });

  test('with the angle across makes one sheet for each value left over', async () => {
    const { workbook } = await made200({ down: ['bolt_size'], across: 'angle', sense: 'compression' });
    expect(workbook.worksheets.slice(0, 2).map(({ name }) => name)).toEqual(['1 10 mm', '2 12 mm']);
    workbook.worksheets.slice(0, 2).forEach((sheet, plate) => {
      const first = rowUnder(sheet, 'Bolt size d');
      for (let bolt = 0; bolt < 2; bolt++)
        for (let angle = 0; angle < 9; angle++) {
          const cells = [2 + 2 * angle, 3 + 2 * angle].map(
            (column) => sheet.getCell(first + bolt, column).value,
          );
          expect(cells).toEqual(shown(plate * 2 + bolt, 1, angle));
        }
      expect(firstColumn(sheet)).toContain(`Plate thickness: ${[10, 12][plate]} mm`);
    });
  });

  test('with the angle and a parameter held shows that slice', async () => {
    const held = { angle: 20, plate_thickness: 12 };
    const { workbook } = await made200({
      down: ['bolt_size'],
      across: 'plate_thickness',
      held: { angle: 20 },
    });
    const first = rowUnder(workbook.worksheets[0]!, 'Bolt size d');
    expect(workbook.worksheets[0]!.getCell(first + 1, 4).value).toBe(shown(3, 0, 5)[0]);
    const answer = await ask({ down: ['bolt_size'], across: 'plate_thickness', held });
    expect(problemIn(answer)).toMatchObject({ errors: [{ field: 'held.plate_thickness' }] });
  });

  test('is titled, framed and footed', async () => {
    const { workbook } = await made200({ drawingNumber: '@D-100', paper: 'A4' });
    const sheet = workbook.worksheets[0]!;
    const lines = firstColumn(sheet);
    const { firm } = (await harness.db.models.Settings.findByPk(1))!;
    expect(lines[0]).toBe(firm);
    expect(lines[1]).toBe('GP-01 =HYPERLINK("x")');
    expect(lines[2]).toMatch(/^Revision A \(published\), published \d{4}-\d\d-\d\d, hash c0ffee000000$/);
    expect(lines).toContain('Load in tension; capacities rounded down to steps of 1 kN');
    expect(lines).toContain('Drawing @D-100');
    expect(lines).toContain(
      'Author The standards-manager, checker The engineer, publisher The standards-manager',
    );
    for (const caution of CAUTIONS) expect(lines).toContain(caution);
    const top = rowUnder(sheet, 'Plate thickness t, mm') - 1;
    expect(sheet.views[0]).toMatchObject({ state: 'frozen', xSplit: 2, ySplit: top });
    expect(sheet.pageSetup).toMatchObject({
      paperSize: 9,
      orientation: 'landscape',
      fitToPage: true,
      fitToWidth: 1,
    });
    expect(sheet.pageSetup.printTitlesRow).toBe(`1:${top}`);
    expect(sheet.headerFooter.oddFooter).toBe(
      '&LGP-01 revision A (published)&Chash c0ffee000000&RPage &P of &N',
    );
  });

  test('explains itself: codes, rules, cautions first, hash and fixed parameters', async () => {
    const { workbook } = await made200();
    const legend = firstColumn(workbook.getWorksheet('Legend')!);
    for (const code of codes()) expect(legend).toContain(code);
    for (let rule = 1; rule <= made.laidOut.kind.rules.length; rule++) expect(legend).toContain(String(rule));
    const basis = workbook.getWorksheet('Basis and cautions')!;
    const lines = firstColumn(basis);
    expect(lines.slice(1, 5)).toEqual(['Cautions', ...CAUTIONS]);
    for (const note of made.laidOut.kind.notes) expect(lines).toContain(note);
    const value = (name: string) =>
      [2, 3].map((column) => basis.getCell(lines.lastIndexOf(name) + 1, column).value);
    expect(value('Hash of the revision, SHA-256')[0]).toBe(made.row.contentHash);
    expect(value('Engine version')[0]).toBe('1.0.0');
    expect(basis.getColumn(1).values).toContain('Weld leg');
  });

  test('holds no formula, whatever a name begins with', async () => {
    const { workbook } = await made200({ drawingNumber: '=1+1' });
    workbook.eachSheet((sheet) =>
      sheet.eachRow((row) => row.eachCell((cell) => expect(cell.formula, cell.address).toBeUndefined())),
    );
  });
});

describe('the register', () => {
  test('holds the hash of the very file, newest first, with an audit entry', async () => {
    await made200({ drawingNumber: 'D-1' });
    const { answer, bytes } = await made200({ drawingNumber: 'D-2' });
    expect(answer.headers['x-file-hash']).toBe(sha256(bytes));
    expect(answer.headers['content-disposition']).toBe(
      'attachment; filename="GP-01_A_tension.xlsx"; filename*=UTF-8\'\'GP-01_A_tension.xlsx',
    );
    const [last, before] = await entries();
    expect(last).toMatchObject({
      familyCode: 'GP-01',
      letter: 'A',
      shortHash: 'c0ffee000000',
      drawingNumber: 'D-2',
      fileHash: sha256(bytes),
      person: { name: 'The drafter' },
    });
    expect(before!.drawingNumber).toBe('D-1');
    const [audit] = await harness.db.select<{ subject_id: string; detail: string }>(
      "SELECT subject_id, detail FROM audit WHERE action = 'table.exported' ORDER BY seq DESC LIMIT 1",
    );
    expect(audit!.subject_id).toBe(String(last!.id));
    expect(JSON.parse(audit!.detail)).toMatchObject({ family: 'GP-01', fileHash: sha256(bytes) });
  });

  test('gets no entry from a request that fails', async () => {
    const before = (await entries()).length;
    expect((await ask({ across: 'pitch' })).status).toBe(422);
    expect((await entries()).length).toBe(before);
  });
});

test('a layout is refused with every fault in its field', async () => {
  const answer = await ask({
    down: ['pitch', 'bolt_size'],
    across: 'bolt_size',
    held: { plate_thickness: 11 },
  });
  expect(answer.status).toBe(422);
  expect(answer.headers['content-type']).toContain('application/problem+json');
  const { errors } = problemIn(answer) as { errors: { field: string }[] };
  expect(errors.map(({ field }) => field).sort()).toEqual([
    'across',
    'down.0',
    'held.angle',
    'held.plate_thickness',
  ]);
});

test('more than 60 sheets are refused', async () => {
  const weld_leg = { mode: 'range', from: 5, to: 12, step: 0.5 } as const;
  const rows = { mode: 'range', from: 2, to: 6, step: 1 } as const;
  const parameters = { ...smallDefinition.parameters, weld_leg, rows };
  const large = await makeSwept(harness, {
    code: 'GP-08',
    definition: {
      ...smallDefinition,
      parameters,
      angles: { mode: 'list', values: [0] },
      senses: ['tension'],
    },
  });
  const answer = await ask({ down: ['angle'], across: 'bolt_size' }, large);
  expect(problemIn(answer)).toMatchObject({
    errors: [{ field: 'held', value: 150, message: expect.stringContaining('at most 60') as string }],
  });
});

test('a database that fails half-way gives a problem, never half a file', async () => {
  const before = (await entries()).length;
  const { select } = harness.db;
  const failing = vi
    .spyOn(harness.db, 'select')
    .mockImplementation((sql, ...rest) =>
      sql.includes('ordinal IN') ? Promise.reject(new Error('The disk is gone.')) : select(sql, ...rest),
    );
  const answer = await ask();
  failing.mockRestore();
  expect(answer.status).toBe(500);
  expect(problemIn(answer)).toMatchObject({ code: 'internal' });
  expect(answer.headers['content-disposition']).toBeUndefined();
  expect((await entries()).length).toBe(before);
});

describe('what is not in force', () => {
  test('is exported with a loud warning when it once was', async () => {
    const withdrawn = await makeSwept(harness, { code: 'GP-05', state: 'withdrawn' });
    const { workbook, answer } = await made200({}, withdrawn);
    expect(answer.headers['content-disposition']).toContain('GP-05_A_tension_WITHDRAWN.xlsx');
    const warning = 'WITHDRAWN: not to be used. Reason: The end distance was wrong.';
    for (const sheet of workbook.worksheets) {
      expect(sheet.getCell(1, 1).value).toBe(warning);
      expect(sheet.getCell(1, 1).font).toMatchObject({ bold: true, size: 16 });
    }
  });

  test('is refused before it is published', async () => {
    const checked = await makeSwept(harness, { code: 'GP-06', state: 'checked' });
    expect((await ask({}, checked)).status).toBe(404);
    const engineer = await harness.signedIn('engineer');
    const answer = await askForTable(engineer, { revisionId: checked.row.id, ...layout });
    expect(answer.status).toBe(409);
    expect(problemIn(answer)).toMatchObject({ code: 'state-conflict' });
  });
});

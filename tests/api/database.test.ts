import { afterAll, beforeAll, describe, expect, test } from 'vitest';
import { createHarness, type Harness } from './harness.ts';

let harness: Harness;

beforeAll(async () => {
  harness = await createHarness();
});
afterAll(() => harness.close());

const lockVersions = async () =>
  (await harness.db.select<{ n: number }>('SELECT SUM(lock_version) AS n FROM people'))[0]?.n;

test('every connection has the settings that keep changes from being lost', async () => {
  const rows = await Promise.all(
    Array.from({ length: 6 }, () =>
      harness.db.select(
        'SELECT @@tx_isolation AS isolation, @@innodb_snapshot_isolation AS snapshot, @@sql_mode AS mode, @@time_zone AS zone, SLEEP(0.05) AS s',
      ),
    ),
  );
  for (const [row] of rows) {
    expect(row).toEqual({
      isolation: 'READ-COMMITTED',
      snapshot: 1,
      mode: 'STRICT_TRANS_TABLES,ERROR_FOR_DIVISION_BY_ZERO,NO_ENGINE_SUBSTITUTION',
      zone: '+00:00',
      s: 0,
    });
  }
});

describe('a transaction', () => {
  test('that loses a deadlock is tried again until it is done', async () => {
    const { engineer, drafter } = harness.people;
    let runs = 0;
    const raise = (first: number, second: number) =>
      harness.db.transaction(async (transaction) => {
        runs += 1;
        const sql = 'UPDATE people SET lock_version = lock_version + 1 WHERE id = ?';
        await harness.db.execute(sql, [first], transaction);
        await new Promise((resolve) => setTimeout(resolve, 30));
        await harness.db.execute(sql, [second], transaction);
      });
    const before = Number(await lockVersions());
    await Promise.all([
      raise(engineer.id, drafter.id),
      raise(drafter.id, engineer.id),
      raise(engineer.id, drafter.id),
      raise(drafter.id, engineer.id),
    ]);
    expect(await lockVersions()).toBe(before + 8);
    expect(runs).toBeGreaterThan(4);
  });

  test('that fails otherwise is run once and leaves nothing', async () => {
    const before = await lockVersions();
    let runs = 0;
    const failing = harness.db.transaction(async (transaction) => {
      runs += 1;
      await harness.db.execute('UPDATE people SET lock_version = lock_version + 1', undefined, transaction);
      throw new Error('no');
    });
    await expect(failing).rejects.toThrow('no');
    expect(runs).toBe(1);
    expect(await lockVersions()).toBe(before);
  });

  test('that read an old version cannot save over the new one', async () => {
    const { Person } = harness.db.models;
    const { id } = harness.people.admin;
    const [one, two] = await Promise.all([Person.findByPk(id), Person.findByPk(id)]);
    await one?.update({ name: 'First' });
    await expect(two?.update({ name: 'Second' })).rejects.toMatchObject({
      name: 'SequelizeOptimisticLockError',
    });
    expect((await Person.findByPk(id))?.name).toBe('First');
  });
});

test('values go in and come out as they are', async () => {
  const text = "O'Brien \\ ? :name \u00e9 \u{1F529} \u0000 %";
  const bytes = Buffer.from(new Float32Array([1.5, Number.NaN, -0]).buffer);
  const [row] = await harness.db.select<{ text: string; bytes: Buffer; big: number; half: number }>(
    'SELECT :text AS text, :bytes AS bytes, :big AS big, :half AS half',
    { text, bytes, big: 2 ** 53 - 1, half: 0.1 },
  );
  expect(row?.text).toBe(text);
  expect(Buffer.from(row?.bytes ?? []).equals(bytes)).toBe(true);
  expect(row?.big).toBe(2 ** 53 - 1);
  expect(row?.half).toBe(0.1);
});

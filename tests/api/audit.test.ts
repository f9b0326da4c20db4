import { createConnection, type Connection } from 'mariadb';
import { afterAll, beforeAll, beforeEach, describe, expect, test } from 'vitest';
import { BEGINNING, entryHash } from '@server/features/audit/chain.ts';
import { appendAudit } from '@server/features/audit/service.ts';
import { verifyAudit } from '@server/features/audit/verification-service.ts';
import { createHarness, type Harness } from './harness.ts';

let harness: Harness;
let owner: Connection;
const triggers = [
  'audit_no_update',
  'audit_no_delete',
  'audit_head_no_delete',
  'audit_head_no_insert',
  'audit_head_forward',
];

/** The owner of the tables takes the guards away, as nobody else can. */
beforeAll(async () => {
  harness = await createHarness();
  owner = await createConnection(harness.ownerUrl);
});
afterAll(async () => {
  await owner.end();
  await harness.close();
});

const append = (n: number) =>
  harness.db.transaction((transaction) =>
    appendAudit(transaction, {
      actorId: harness.people.admin.id,
      action: 'trial.done',
      subjectType: 'trial',
      subjectId: n,
      detail: { n, text: "O'Brien \\ ? :n \u00e9 \u{1F529}", nested: { b: 1, a: [null, true] } },
    }),
  );

test('the program may add to the trail, and change nothing of it', async () => {
  await append(0);
  for (const statement of [
    "UPDATE audit SET detail = '{}'",
    'DELETE FROM audit',
    'DELETE FROM audit_head',
    'UPDATE audit_head SET seq = seq - 1',
    'UPDATE audit_head SET seq = 0',
    "INSERT INTO audit_head (id, seq, hash) VALUES (2, 0, '')",
    "REPLACE INTO audit SELECT seq, at, actor_id, 'other', subject_type, subject_id, detail, previous_hash, hash FROM audit",
  ]) {
    await expect(harness.db.execute(statement), statement).rejects.toMatchObject({
      original: { errno: 1644 },
    });
  }
  expect((await verifyAudit(harness.db)).valid).toBe(true);
});

test('an entry hashes the one before and itself in canonical form', () => {
  const entry = {
    seq: 1,
    at: '2026-01-31 12:00:00.000000',
    actorId: null,
    action: 'a',
    subjectType: 'b',
    subjectId: 'c',
    detail: '{}',
  };
  // From coreutils: printf '%064d\n%s' 0 '<the JSON below>' | sha256sum
  // {"action":"a","actorId":null,"at":"2026-01-31 12:00:00.000000","detail":"{}","seq":1,"subjectId":"c","subjectType":"b"}
  expect(entryHash(BEGINNING, entry)).toBe(
    'f9a895cd748a1e25e939375d6d9dc96a9652432db926f0f96e638fa4c6a30ba8',
  );
});

test('entries written at the same moment stand in one row without gaps', async () => {
  await Promise.all(Array.from({ length: 24 }, (_, n) => append(n)));
  const { valid, entries, faults } = await verifyAudit(harness.db);
  expect(faults).toEqual([]);
  expect(valid).toBe(true);
  const [row] = await harness.db.select<{ n: number; last: number }>(
    'SELECT COUNT(*) AS n, MAX(seq) AS last FROM audit',
  );
  expect(row).toEqual({ n: entries, last: entries });
});

test('an entry is not there when its change is not', async () => {
  const before = await verifyAudit(harness.db);
  const failing = harness.db.transaction(async (transaction) => {
    await appendAudit(transaction, {
      actorId: null,
      action: 'trial.lost',
      subjectType: 'trial',
      subjectId: 1,
    });
    throw new Error('the change failed');
  });
  await expect(failing).rejects.toThrow('the change failed');
  expect(await verifyAudit(harness.db)).toEqual(before);
});

describe('a trail that was tampered with', () => {
  let saved: Record<string, unknown>[];
  let anchor: { seq: number; hash: string };

  beforeAll(async () => {
    for (const name of triggers) await owner.query(`DROP TRIGGER ${name}`);
    saved = await owner.query('SELECT * FROM audit ORDER BY seq');
    anchor = (await owner.query('SELECT seq, hash FROM audit_head'))[0] as typeof anchor;
    anchor = { seq: Number(anchor.seq), hash: anchor.hash };
    await owner.query('CREATE TABLE kept AS SELECT * FROM audit');
  });
  beforeEach(async () => {
    await owner.query('DELETE FROM audit');
    await owner.query('INSERT INTO audit SELECT * FROM kept');
    await owner.query('UPDATE audit_head SET seq = ?, hash = ?', [anchor.seq, anchor.hash]);
    expect((await verifyAudit(harness.db, anchor)).valid).toBe(true);
  });

  const last = () => saved.length;
  const fault = async (seq: number, text: string) => {
    const { valid, faults } = await verifyAudit(harness.db, anchor);
    expect(valid).toBe(false);
    expect(faults).toContainEqual({ seq, message: expect.stringContaining(text) as string });
  };

  test.each([
    ["detail = '{}'"],
    ["action = 'person.changed'"],
    ['actor_id = NULL'],
    ["subject_id = '99'"],
    ['at = at + INTERVAL 1 SECOND'],
  ])('shows the edit %s', async (change) => {
    await owner.query(`UPDATE audit SET ${change} WHERE seq = 7`);
    await fault(7, 'altered');
  });

  test('shows an edit whose hash was worked out anew', async () => {
    const [row] = (await owner.query(
      'SELECT *, CAST(at AS CHAR) AS text FROM audit WHERE seq = 7',
    )) as Record<string, string>[];
    const hash = entryHash(String(row?.previous_hash), {
      seq: 7,
      at: String(row?.text),
      actorId: Number(row?.actor_id),
      action: String(row?.action),
      subjectType: String(row?.subject_type),
      subjectId: String(row?.subject_id),
      detail: '{}',
    });
    await owner.query("UPDATE audit SET detail = '{}', hash = ? WHERE seq = 7", [hash]);
    await fault(8, 'does not follow');
  });

  test('shows an entry taken out', async () => {
    await owner.query('DELETE FROM audit WHERE seq = 7');
    await fault(8, 'entries 7 to 7 are missing');
  });

  test('shows an entry put in', async () => {
    await owner.query('UPDATE audit SET seq = seq + 1000 WHERE seq > 7');
    await owner.query('UPDATE audit SET seq = seq - 999 WHERE seq > 1000');
    await owner.query(
      "INSERT INTO audit SELECT 8, at, actor_id, 'trial.forged', subject_type, subject_id, detail, hash, REPEAT('a', 64) FROM audit WHERE seq = 7",
    );
    await fault(8, 'altered');
    await fault(9, 'does not follow');
  });

  test('shows two entries that changed places', async () => {
    await owner.query('UPDATE audit SET seq = 5000 WHERE seq = 7');
    await owner.query('UPDATE audit SET seq = 7 WHERE seq = 8');
    await owner.query('UPDATE audit SET seq = 8 WHERE seq = 5000');
    await fault(7, 'altered');
  });

  test('shows a tail cut off, by the head row', async () => {
    await owner.query('DELETE FROM audit WHERE seq > ?', [last() - 3]);
    await fault(last(), `ends with entry ${last() - 3}`);
  });

  test('shows a tail cut off together with the head, by the hash that was kept elsewhere', async () => {
    await owner.query('DELETE FROM audit WHERE seq > ?', [last() - 3]);
    await owner.query('UPDATE audit_head SET seq = ?, hash = (SELECT hash FROM audit WHERE seq = ?)', [
      last() - 3,
      last() - 3,
    ]);
    expect((await verifyAudit(harness.db)).valid).toBe(true);
    await fault(last(), 'whose hash was kept');
  });

  test('is reported to the admin', async () => {
    await owner.query("UPDATE audit SET detail = '{}' WHERE seq = 7");
    const admin = await harness.signedIn('admin');
    const { body } = await admin.get('/api/audit/verification').expect(200);
    expect(body).toMatchObject({ valid: false, faults: [{ seq: 7 }] });
  });
});

describe('the list', () => {
  test('is newest first, in pages, with names', async () => {
    const admin = await harness.signedIn('admin');
    const { body } = await admin.get('/api/audit').query({ count: 10 }).expect(200);
    const page = body as {
      entries: { seq: number; action: string; actor: { name: string } }[];
      next: number;
    };
    expect(page.entries).toHaveLength(10);
    expect(page.entries[0]).toMatchObject({ action: 'person.signed-in', actor: { name: 'The admin' } });
    expect(page.next).toBe(page.entries[9]?.seq);
    const second = await admin.get('/api/audit').query({ count: 200, before: page.next }).expect(200);
    expect((second.body as typeof page).entries[0]?.seq).toBe(page.next - 1);
    expect((second.body as typeof page).next).toBeNull();
    await admin.get('/api/audit').query({ count: 201 }).expect(422);
  });
});

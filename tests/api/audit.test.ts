import { afterEach, beforeEach, describe, expect, test } from 'vitest';
import { auditEntries, producerDb } from '../../server/db';
import { auditHash } from '../../server/http/run-action';
import { alder, alderPeople } from '../cast';
import { hour, idOf, morning } from '../factories';
import { browserOf, testApp, type Agent, type TestApp } from '../support/server';

let server: TestApp;
let ada: Agent;
beforeEach(async () => {
  server = await testApp('alder');
  ada = browserOf(server, alderPeople.admin);
});
afterEach(() => server.close());

const at = `/api/${alder.slug}`;
const id = (thing: string) => idOf(alder.namespace, thing);

interface Entry {
  seq: number;
  act: string;
  actor: { id: string } | null;
}
const acts = async (query = ''): Promise<string[]> => (await ada.get(`${at}/audit${query}`).expect(200)).body.entries.map(({ act }: Entry) => act);

async function someActs() {
  await browserOf(server, alderPeople.manager).post(`${at}/requests`).send({ storeId: id('lantern'), kind: 'leak' }).expect(201);
  server.clock.now = morning + 11 * hour;
  await ada.post(`${at}/telemetry-keys`).send({ name: 'Second' }).expect(201);
}

describe('the audit trail', () => {
  test('names what was done and by whom, youngest first, page by page', async () => {
    await someActs();
    const first = await ada.get(`${at}/audit?limit=2`).expect(200);
    expect(first.body.entries).toEqual([
      expect.objectContaining({ act: 'create-telemetry-key', subject: 'TelemetryKey', actor: expect.objectContaining({ id: id('admin') }) }),
      expect.objectContaining({ act: 'file-request', subject: 'Request', actor: expect.objectContaining({ id: id('manager') }) }),
    ]);
    const rest = await ada.get(`${at}/audit?limit=2&after=${first.body.next}`).expect(200);
    expect(rest.body.entries).toEqual([expect.objectContaining({ seq: 1, actor: null })]);
    expect(rest.body.next).toBeNull();
  });

  test('by subject, by person, by day of the producer', async () => {
    await someActs();
    expect(await acts('?subject=Request')).toEqual(['file-request']);
    expect(await acts(`?actor=${id('admin')}`)).toEqual(['create-telemetry-key']);
    // Eight in the evening in Chicago is already the next day in Greenwich.
    expect(await acts('?from=2026-12-01&to=2026-12-01')).toEqual(['create-telemetry-key', 'file-request']);
    expect(await acts('?from=2026-12-02')).toEqual([]);
  });

  test('each line is chained to the one before, and neither can be changed', async () => {
    await someActs();
    const lines = producerDb(server.db, idOf(alder.slug, 'producer'))
      .select({
        producerId: auditEntries.producerId,
        seq: auditEntries.seq,
        at: auditEntries.at,
        actor: auditEntries.actor,
        act: auditEntries.act,
        subject: auditEntries.subject,
        subjectId: auditEntries.subjectId,
        changes: auditEntries.changes,
        previousHash: auditEntries.previousHash,
        hash: auditEntries.hash,
        id: auditEntries.id,
      })
      .from(auditEntries)
      .orderBy(auditEntries.seq)
      .all();
    expect(lines.map(({ seq }) => seq)).toEqual([1, 2, 3]);
    for (const [i, line] of lines.slice(1).entries()) {
      expect(line.previousHash).toBe(lines[i]?.hash);
      expect(auditHash(line)).toBe(line.hash);
      expect(auditHash({ ...line, changes: `${line.changes} ` })).not.toBe(line.hash);
    }
    const change = (sql: string) => () => server.db.$client.prepare(sql).run(idOf(alder.slug, 'producer'));
    expect(change("update audit_entry set act = 'x' where producer_id = ?")).toThrow(/append-only/);
    expect(change('delete from audit_entry where producer_id = ?')).toThrow(/append-only/);
  });
});

import { expect, test } from 'vitest';
import { acrossProducers } from '../../server/db/statement-hook';
import { alder, alderPeople } from '../cast';
import { idOf } from '../factories';
import { browserOf, testApp } from '../support/server';

const id = (thing: string) => idOf(alder.namespace, thing);
const at = `/api/${alder.slug}`;
const questions = [
  `${at}/stores`,
  `${at}/stores?q=a&truck=today`,
  `${at}/stores?district=${id('north')}&account=${id('chain')}`,
  `${at}/stores?retired=only`,
  `${at}/stores/${id('lantern')}`,
  `${at}/stores/${id('lantern')}/deliveries`,
  `${at}/freezers`,
  `${at}/freezers?show=first&q=front&district=${id('north')}&account=${id('chain')}`,
  `${at}/freezers?q=zzzz&show=silent&store=${id('lantern')}`,
  `${at}/freezer-digest?q=front`,
  `${at}/freezer-map?show=warm`,
  `${at}/freezers.csv`,
  `${at}/audit.csv?actor=${id('manager')}`,
  `${at}/settings`,
  `${at}/freezers/${id('lantern freezer')}`,
  `${at}/next-trucks`,
  `${at}/next-trucks?q=a&truck=late&district=${id('north')}`,
  `${at}/comparison`,
  `${at}/comparison?q=a`,
  `${at}/comparison.csv`,
  `${at}/requests`,
  `${at}/requests?state=any&assignee=me`,
  `${at}/requests?state=open&store=${id('lantern')}`,
  `${at}/requests/${id('cold request')}`,
  `${at}/assignees`,
  `${at}/accounts`,
  `${at}/accounts?q=a&retired=only`,
  `${at}/accounts/${id('chain')}`,
  `${at}/districts`,
  `${at}/products`,
  `${at}/products?retired=too`,
  `${at}/models?retired=too`,
  `${at}/stores/${id('lantern')}/settings`,
  `${at}/freezers/${id('lantern freezer')}/settings`,
  `${at}/telemetry-keys`,
  `${at}/people?q=a&role=store-manager`,
  `${at}/places`,
  `${at}/audit`,
  `${at}/audit?subject=Request&from=2026-11-01&to=2026-12-01`,
  `${at}/unclaimed-sensors`,
  `${at}/sensors?q=a`,
  `${at}/quarantined-readings`,
  '/api/me',
  '/api/me/sessions',
];

interface Step {
  detail: string;
}

/** A scan reads a whole table, whatever its alias; a search starts at an index. A list bound as JSON is no table, nor are rows picked before; a MATCH asks the full-text index. */
const scans = (steps: Step[]): string[] => steps.map(({ detail }) => detail).filter((detail) => /^SCAN (?!CONSTANT|json_each|picked|fleet_text VIRTUAL TABLE INDEX 0:M)/.test(detail));

test('no page reads a whole table, whoever asks', async () => {
  const bed = await testApp('alder');
  const asked = new Map<string, unknown>();
  const { $client } = bed.db;
  const prepare = $client.prepare.bind($client);
  $client.prepare = ((source: string) => {
    asked.set(source, null);
    return prepare(source);
  }) as typeof $client.prepare;
  for (const person of [alderPeople.admin, alderPeople.rep, alderPeople.manager, alderPeople.technician, alderPeople.driver]) {
    const agent = browserOf(bed, person);
    for (const question of questions) await agent.get(question);
  }
  const selects = [...asked.keys()].filter((source) => /^\s*select/i.test(source));
  expect(selects.length).toBeGreaterThan(20);
  const faults = selects.flatMap((source) => {
    const holes = (source.match(/\?/g) ?? []).map(() => null);
    const steps = acrossProducers('explaining', () => prepare(`explain query plan ${source}`)).all(...holes) as Step[];
    return scans(steps).map((detail) => `${detail}\n    in ${source.replace(/\s+/g, ' ').slice(0, 160)}`);
  });
  expect(faults).toEqual([]);
  await bed.close();
});

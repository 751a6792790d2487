import { expect, test } from 'vitest';
import { alderMembers } from '../cast';
import { testApp, type TestApp } from '../support/server';
import { cases } from './cases';
import { surveyOwn, watchWrites } from './survey';

/** Twin has Alder's very ids, so a query that forgets its producer anywhere changes an answer. */
test('who else is in the installation changes no byte of an answer or a mail', async () => {
  const [alone, among] = [await testApp('alder'), await testApp('all')];
  const differing: string[] = [];
  let compared = 0;
  for (const server of [alone, among]) watchWrites(server);
  for (const name of alderMembers) {
    for (const one of cases.filter(({ endpoint }) => endpoint.access.kind !== 'dev')) {
      const ask = (server: TestApp) => surveyOwn(server, one, name);
      const [before, after] = [await ask(alone), await ask(among)];
      compared += 1;
      if (before.answer !== after.answer) differing.push(`${one.endpoint.id} as ${name}: ${before.answer}\n---\n${after.answer}`);
    }
  }
  expect(differing).toEqual([]);
  expect(compared).toBeGreaterThan(300);
  await Promise.all([alone.close(), among.close()]);
});

import { readdirSync, readFileSync } from 'node:fs';
import { describe, expect, test } from 'vitest';
import { problems } from '../../../server/contract/problem';
import { entryKinds, languages, requestKinds, requestStates, roles } from '../../../server/contract/words';
import { attentions } from '../../../server/contract/stores';

type Words = { [key: string]: string | Words };
const words = (language: string, noun: string): Words => JSON.parse(readFileSync(`locales/${language}/${noun}.json`, 'utf8')) as Words;
const at = (from: Words, path: string): unknown => path.split('/').reduce<unknown>((here, key) => (here as Words | undefined)?.[key], from);

const contract = readdirSync('server/contract').map((file) => readFileSync(`server/contract/${file}`, 'utf8')).join('\n');
const faults = [...contract.matchAll(/fault\('([a-z-]+)'\)|error: '([a-z-]+)'/g)].map((match) => match[1] ?? match[2] ?? '');

describe.each(languages)('in %s there are words for', (language) => {
  test.each([...Object.keys(problems), 'offline'])('the problem %s: what it is and what to do', (type) => {
    expect(at(words(language, 'problems'), `${type}/title`)).toMatch(/\S/);
    expect(at(words(language, 'problems'), `${type}/help`)).toMatch(/\S/);
  });

  test('every fault of the contract', () => {
    expect(faults).toContain('required');
    for (const fault of [...new Set(faults), 'invalid', 'unknown-field']) expect([fault, at(words(language, 'validation'), fault)]).toEqual([fault, expect.stringMatching(/\S/)]);
  });

  test.each([
    ['common', 'roles', roles],
    ['requests', 'kinds', requestKinds],
    ['requests', 'states', requestStates],
    ['requests', 'one/told', requestStates],
    ['requests', 'entries', entryKinds.filter((kind) => kind !== 'photos')],
    ['stores-list', 'attention', attentions],
  ])('%s: %s', (noun, path, keys) => {
    for (const key of keys) expect([key, at(words(language, noun), `${path}/${key}`)]).toEqual([key, expect.stringMatching(/\S/)]);
  });
});

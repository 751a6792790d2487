import { expect, test } from 'vitest';
import { subjects, type Subject } from '../../server/contract/ability';
import { languages, type Language } from '../../server/contract/words';
import { changeNouns, wordsOf } from '../../src/features/audit/value-words';
import { auditTrail } from './audit-lines';
import { textOf } from './sources';

const { acts, lines } = auditTrail();

test('the server’s acts and what they write down are found', () => {
  const fieldsOf = (subject: Subject) => lines.flatMap((line) => (line.subject === subject ? [...line.fields.keys()] : []));
  expect(acts.length).toBeGreaterThan(30);
  expect(acts).toEqual(expect.arrayContaining(['create-producer', 'change-store', 'set-next-trucks', 'see-as']));
  expect(fieldsOf('Account')).toEqual(expect.arrayContaining(['terms', 'contacts', 'retired']));
  expect(fieldsOf('Freezer')).toEqual(expect.arrayContaining(['assetNumber', 'headroomIn', 'widthShare', 'probesIn', 'sensorId']));
  expect(fieldsOf('Settings')).toEqual(expect.arrayContaining(['serviceHours', 'days', 'senderName', 'logo']));
});

test.each(languages)('every act, subject and field of the trail has words: %s', (language) => {
  const fields = lines.flatMap((line) => [...line.fields.keys()]);
  const wanted = [...acts.map((act) => `acts.${act}`), ...subjects.map((subject) => `subjects.${subject}`), ...fields.map((field) => `fields.${field}`)];
  expect([...new Set(wanted)].filter((key) => !said(language, `audit:${key}`))).toEqual([]);
});

test.each(languages)('so has every value of a closed list, among the nouns a change is told with: %s', (language) => {
  const wanted = lines.flatMap(({ subject, fields }) => [...fields].flatMap(([field, values]) => [...values].map((value) => `${wordsOf(subject, field) ?? `${subject}.${field}`}.${value}`)));
  expect(wanted.length).toBeGreaterThan(30);
  expect([...new Set(wanted)].filter((key) => !changeNouns.some((noun) => key.startsWith(`${noun}:`)) || !said(language, key))).toEqual([]);
});

/** Whether a text stands under `<noun>:<its path of keys>`. */
function said(language: Language, key: string): boolean {
  const [noun = '', keys = ''] = key.split(':');
  const file: unknown = JSON.parse(textOf(`locales/${language}/${noun}.json`));
  return typeof keys.split('.').reduce(within, file) === 'string';
}

const within = (texts: unknown, key: string): unknown => (typeof texts === 'object' && texts !== null ? Object.entries(texts).find(([one]) => one === key)?.[1] : undefined);

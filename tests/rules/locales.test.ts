import { describe, expect, test } from 'vitest';
import { problems } from '../../server/contract/problem';
import { languages, type Language } from '../../server/contract/words';
import { filesBelow, textOf } from './sources';

type Texts = Record<string, string>;

/** Every text of a file by its path of keys; lists count by their place. */
function texts(value: unknown, key = ''): Texts {
  if (typeof value === 'string') return { [key]: value };
  return Object.assign({}, ...Object.entries(value ?? {}).map(([name, inner]) => texts(inner, key ? `${key}.${name}` : name)));
}

const files = (language: Language): string[] => filesBelow(`locales/${language}`, /\.json$/).map((file) => file.replace(/^.*\//, ''));
const nouns = files('en');
const read = (language: Language, file: string): Texts => texts(JSON.parse(textOf(`locales/${language}/${file}`)));

const PLURAL = /_(zero|one|two|few|many|other)$/;
const folded = (all: Texts): string[] => [...new Set(Object.keys(all).map((key) => key.replace(PLURAL, '')))].sort();
const plurals = (all: Texts): Map<string, string[]> => {
  const found = new Map<string, string[]>();
  for (const key of Object.keys(all)) {
    const form = PLURAL.exec(key)?.[1];
    const base = key.replace(PLURAL, '');
    if (form) found.set(base, [...(found.get(base) ?? []), form]);
  }
  return found;
};
/** What a text is filled with, over all its plural forms. */
const filledWith = (all: Texts, base: string): string[] =>
  [...new Set(Object.entries(all).filter(([key]) => key.replace(PLURAL, '') === base).flatMap(([, text]) => text.match(/\{\{[^}]+\}\}|<\/?\w+>/g) ?? []))].sort();

test('both languages have the same files', () => {
  expect(languages).toEqual(['en', 'es']);
  expect(files('es')).toEqual(nouns);
  expect(nouns.length).toBeGreaterThan(8);
});

describe.each(nouns)('%s', (file) => {
  const en = read('en', file);
  const es = read('es', file);

  test('has the same keys in both languages', () => {
    expect(folded(es)).toEqual(folded(en));
  });

  test('counts as each language counts', () => {
    for (const [base, forms] of plurals(en)) expect([base, ...forms.sort()]).toEqual([base, 'one', 'other']);
    for (const [base, forms] of plurals(es)) expect([base, ...forms.sort()]).toEqual([base, 'many', 'one', 'other']);
    expect([...plurals(es).keys()].sort()).toEqual([...plurals(en).keys()].sort());
  });

  test('has no empty text', () => {
    for (const [key, text] of [...Object.entries(en), ...Object.entries(es)]) expect(text.trim(), key).not.toBe('');
  });

  test('is filled with the same things in both languages', () => {
    for (const base of folded(en)) expect([base, filledWith(es, base)]).toEqual([base, filledWith(en, base)]);
  });

  test('says nothing in English to a Spanish reader', () => {
    const same = Object.entries(en).filter(([key, text]) => es[key] === text && !ALIKE.has(text) && /\p{L}/u.test(text.replace(/\{\{[^}]+\}\}/g, '')));
    expect(same).toEqual([]);
  });
});

/** Names, and what both languages write alike. */
const ALIKE = new Set(['Nilas', '{{page}} · Nilas', 'EN', 'ES', 'English', 'Español', 'Auto', 'SR-{{number}}', 'Esc', 'No']);

test('every problem has words, and so has being offline', () => {
  for (const language of languages) {
    const all = read(language, 'problems.json');
    const wanted = [...Object.keys(problems), 'offline'].flatMap((type) => [`${type}.title`, `${type}.help`]);
    expect(Object.keys(all).sort(), language).toEqual(wanted.sort());
  }
});

test('every fault a field may have has words', () => {
  const server = [...filesBelow('server/contract'), ...filesBelow('server/features'), ...filesBelow('server/http')];
  const faults = server.flatMap((file) => [...textOf(file).matchAll(/\b(?:fault\(|fault: |error: )'([a-z][a-z-]*)'/g)].map(([, fault = '']) => fault));
  expect(new Set(faults).size).toBeGreaterThan(10);
  for (const language of languages) {
    const known = Object.keys(read(language, 'validation.json')).map((key) => key.replace(PLURAL, ''));
    expect([...new Set(faults)].filter((fault) => !known.includes(fault)), language).toEqual([]);
  }
});

test('every word of the trade’s own lists has words', () => {
  const wrong: string[] = [];
  for (const language of languages) {
    const everything = nouns.map((file) => textOf(`locales/${language}/${file}`)).join('\n');
    for (const word of ['store-manager', 'district-rep', 'support-agent', 'dispatcher', 'driver', 'technician', 'producer-admin', 'not-cooling', 'ice-sooner', 'waiting-on-store']) {
      if (!everything.includes(`"${word}"`)) wrong.push(`${language} ${word}`);
    }
  }
  expect(wrong).toEqual([]);
});

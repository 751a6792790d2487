import { createInstance } from 'i18next';
import { describe, expect, test } from 'vitest';
import en from '../../../locales/en/freezer.json';
import es from '../../../locales/es/freezer.json';
import { layOut, textWidth, type SectionLane } from '../../../src/freezer/section-geometry';

const wordsIn = async (lng: 'en' | 'es') => {
  const i18n = createInstance();
  await i18n.init({ lng, ns: ['freezer'], defaultNS: 'freezer', resources: { en: { freezer: en }, es: { freezer: es } } });
  return i18n.t;
};

const lane: SectionLane = { widthShare: 0.25, label: '7 lb', bags: 9, about: true, stackIn: 6, usableStackIn: 36, bagPounds: 7, low: true };
const { lanes } = layOut({ widthIn: 72, heightIn: 52, channelDropIn: 4, rackIn: 3 }, [lane, lane, lane, lane], []);
const laneWidth = lanes[0]?.stack.width ?? NaN;

describe.each(['en', 'es'] as const)('words under the lanes, %s', (language) => {
  test('four low lanes side by side keep their words apart', async () => {
    const t = await wordsIn(language);
    const captions = [t('section.low'), t('section.empty'), t('section.count-about', { count: 1, bags: '1' }), t('section.count-about', { count: 12, bags: '12' })];
    for (const words of captions) expect(textWidth(words, 11), words).toBeLessThan(laneWidth);
  });
});

test.each([en, es])('one word for one thing: an empty lane, an empty stretch', ({ section, ribbon }) => {
  expect(ribbon.empty).toBe(section.empty);
});

test('one uncertain bag takes no plural article in Spanish', async () => {
  const t = await wordsIn('es');
  expect(t('section.count-about', { count: 1, bags: '1' })).toBe('aprox. 1');
  expect(t('section.count-about', { count: 14, bags: '14' })).toBe('unas 14');
  expect(t('section.count-about', { count: 1_000_000, bags: '1,000,000' })).toBe('unas 1,000,000');
});

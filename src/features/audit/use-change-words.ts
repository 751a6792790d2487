import { useTranslation } from 'react-i18next';
import type { Subject } from '../../../server/contract/ability';
import { spans } from '../../../server/contract/common';
import { formatIn, useFormat } from '../../lib/format';
import { useMembership } from '../../lib/me';
import { spansText } from '../../lib/spans';
import { zoneName } from '../../lib/zones';
import { shortId } from './short-id';
import { changeNouns, numberWords, untold, wordsOf } from './value-words';

interface Line {
  field: string;
  label: string;
  text: string;
}

/** Puts the JSON of a change into words; a field without words of its own keeps its name. */
export function useChangeWords(subject: Subject): (changes: string) => Line[] {
  const { t } = useTranslation(changeNouns);
  const format = useFormat(useMembership().producer.timeZone);

  const labelOf = (field: string) => t([`fields.${field}`, 'other-field'], { field });
  const pair = ([field, value]: [string, unknown]) => `${t('field', { label: labelOf(field) })} ${textOf(field, value)}`;
  function textOf(field: string, value: unknown): string {
    if (value === null || value === undefined || value === '') return t('none');
    if (Array.isArray(value)) return listText(field, value) || t('none');
    if (typeof value === 'object') return entriesOf(value).map(pair).join(', ');
    if (typeof value === 'boolean') return untold.includes(field) ? t('untold') : t(value ? 'yes' : 'no');
    return typeof value === 'number' ? numberWords(field, value, format) : wordText(field, String(value));
  }
  function listText(field: string, values: unknown[]): string {
    if (field === 'openHours') return values.map((hour) => formatIn({ ...format, timeZone: 'UTC' }).time(Number(hour) * HOUR_MS)).join('–');
    const hours = spans.safeParse(values).data;
    return hours ? spansText(hours, format.locale) : values.map((one) => textOf(field, one)).join('; ');
  }
  function wordText(field: string, word: string) {
    if (DAY.test(word)) return format.day(word);
    if (field === 'timeZone') return zoneName(word, format.locale);
    const list = wordsOf(subject, field);
    return list ? t(`${list}.${word}`, { defaultValue: word }) : shortId(word);
  }

  return (changes) => {
    const parsed: unknown = JSON.parse(changes);
    return entriesOf(parsed).map(([field, value]) => ({ field, label: labelOf(field), text: textOf(field, value) }));
  };
}

const HOUR_MS = 3_600_000;
const DAY = /^\d{4}-\d{2}-\d{2}$/;

const entriesOf = (value: unknown): [string, unknown][] => (typeof value === 'object' && value !== null ? Object.entries(value) : []);

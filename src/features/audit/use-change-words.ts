import { useTranslation } from 'react-i18next';
import { useFormat } from '../../lib/format';
import { useMembership } from '../../lib/me';
import { shortId } from './short-id';

interface Line {
  field: string;
  label: string;
  text: string;
}

/** Puts the JSON of a change into words; a field without words of its own keeps its name. */
export function useChangeWords(): (changes: string) => Line[] {
  const { t } = useTranslation(['audit', 'requests']);
  const format = useFormat(useMembership().producer.timeZone);

  const labelOf = (field: string) => t([`fields.${field}`, 'other-field'], { field });
  const pair = ([field, value]: [string, unknown]) => `${t('field', { label: labelOf(field) })} ${textOf(field, value)}`;
  function textOf(field: string, value: unknown): string {
    if (value === null || value === undefined || value === '') return t('none');
    if (Array.isArray(value)) return value.map((one: unknown) => textOf(field, one)).join('; ') || t('none');
    if (typeof value === 'object') return entriesOf(value).map(pair).join(', ');
    if (typeof value === 'boolean') return t(value ? 'yes' : 'no');
    if (typeof value === 'number') return numberText(value);
    return wordText(field, String(value));
  }
  const numberText = (value: number) => (value >= EARLIEST ? `${format.longDate(value)}, ${format.time(value)}` : format.tenths(value));
  function wordText(field: string, word: string) {
    if (DAY.test(word)) return format.day(word);
    const list = lists[field];
    return list ? t(`requests:${list}.${word}`, { defaultValue: word }) : shortId(word);
  }

  return (changes) => {
    const parsed: unknown = JSON.parse(changes);
    return entriesOf(parsed).map(([field, value]) => ({ field, label: labelOf(field), text: textOf(field, value) }));
  };
}

/** The start of 2001: whatever is counted stays far below it, every instant of the trail lies above. */
const EARLIEST = 978_307_200_000;
const DAY = /^\d{4}-\d{2}-\d{2}$/;

/** Fields whose values have words of their own. */
const lists: Partial<Record<string, string>> = { kind: 'kinds', state: 'states' };

const entriesOf = (value: unknown): [string, unknown][] => (typeof value === 'object' && value !== null ? Object.entries(value) : []);

import { useRef } from 'react';
import { Plus, X } from 'lucide-react';
import { useFieldArray } from 'react-hook-form';
import { useTranslation } from 'react-i18next';
import type { Settings } from '../../../server/contract/settings';
import { TextField } from '../../form/text-field';
import { useListFault } from '../../form/use-list-fault';
import { Button, IconButton } from '../../ui/button';
import { FieldError } from '../../ui/field';

type Values = Pick<Settings, 'holidays'>;

const most = 60;

/** Any number of days, each with its name. */
export function HolidaysField() {
  const { t } = useTranslation('settings');
  const adder = useRef<HTMLButtonElement>(null);
  const { fields, append, remove } = useFieldArray<Values, 'holidays'>({ name: 'holidays' });
  const { fault, faultId } = useListFault('holidays');
  const take = (i: number) => {
    remove(i);
    // The pressed button is gone with its day.
    adder.current?.focus();
  };
  return (
    <fieldset className="min-w-0" aria-describedby={faultId ? `${faultId} holidays-hint` : 'holidays-hint'}>
      <legend className="sr-only">{t('holidays.title')}</legend>
      <p id="holidays-hint" className="text-body text-ink-3">
        {t('holidays.hint')}
      </p>
      {faultId && <FieldError id={faultId}>{fault}</FieldError>}
      {fields.length === 0 && <p className="mt-2 text-ink-2">{t('holidays.none')}</p>}
      <ul className="mt-2 grid gap-3 empty:hidden">
        {fields.map(({ id }, i) => (
          <li key={id} className="flex items-start gap-1 border-b border-rule pb-3 sm:border-0 sm:pb-0">
            <div role="group" aria-label={t('holidays.one', { n: i + 1 })} className="grid min-w-0 grow items-start gap-3 sm:grid-cols-[12rem_minmax(0,1fr)]">
              <TextField name={`holidays.${i}.day`} type="date" label={t('holidays.day')} min="2000-01-01" max="9999-12-31" />
              <TextField name={`holidays.${i}.name`} label={t('holidays.name')} autoComplete="off" maxLength={80} />
            </div>
            <span className="mt-6">
              <IconButton label={t('holidays.remove', { n: i + 1 })} icon={<X aria-hidden size={20} />} onClick={() => take(i)} />
            </span>
          </li>
        ))}
      </ul>
      {fields.length < most && (
        <div className="mt-3">
          <Button ref={adder} variant="quiet" size="big" onClick={() => append({ day: '', name: '' })}>
            <Plus aria-hidden size={18} />
            {t('holidays.add')}
          </Button>
        </div>
      )}
    </fieldset>
  );
}

import { useRef } from 'react';
import { Plus, X } from 'lucide-react';
import { useFieldArray } from 'react-hook-form';
import { useTranslation } from 'react-i18next';
import { TextField } from '../../form/text-field';
import { Button, IconButton } from '../../ui/button';
import { noContact, type Entered } from './entered';

/** As many as the contract takes. */
const MOST = 20;

/** Whom to write to or call at the account: as many people as there are. */
export function ContactFields() {
  const { t } = useTranslation('accounts');
  const { fields, append, remove } = useFieldArray<Entered, 'contacts'>({ name: 'contacts' });
  const adder = useRef<HTMLButtonElement>(null);
  const take = (i: number) => {
    remove(i);
    // The pressed button is gone with its contact.
    adder.current?.focus();
  };
  return (
    <fieldset className="min-w-0">
      <legend className="font-semibold">{t('contacts.title')}</legend>
      {fields.length === 0 && <p className="mt-1 text-ink-2">{t('contacts.none')}</p>}
      <ol className="mt-2 grid gap-3 empty:hidden">
        {fields.map(({ id }, i) => (
          <li key={id}>
            <Contact i={i} onRemove={() => take(i)} />
          </li>
        ))}
      </ol>
      <div className="mt-3">
        <Button ref={adder} variant="quiet" size="big" disabled={fields.length >= MOST} onClick={() => append(noContact, { focusName: `contacts.${fields.length}.name` })}>
          <Plus aria-hidden size={18} />
          {t('contacts.add')}
        </Button>
      </div>
    </fieldset>
  );
}

function Contact({ i, onRemove }: { i: number; onRemove: () => void }) {
  const { t } = useTranslation('accounts');
  const name = `contacts.${i}`;
  const which = t('contacts.nth', { n: i + 1 });
  return (
    <div role="group" aria-label={which} className="rounded-card border border-rule bg-surface px-4 pt-1 pb-4">
      <div className="-mr-3 flex items-center justify-between">
        <span aria-hidden className="text-small text-ink-3">
          {which}
        </span>
        <IconButton label={t('contacts.remove', { n: i + 1 })} icon={<X aria-hidden size={20} />} onClick={onRemove} />
      </div>
      <div className="grid gap-3 sm:grid-cols-2">
        <TextField name={`${name}.name`} label={t('contacts.name')} maxLength={120} autoComplete="off" />
        <TextField name={`${name}.work`} label={t('contacts.work')} maxLength={80} autoComplete="off" />
        <TextField name={`${name}.email`} label={t('contacts.email')} type="email" maxLength={254} autoComplete="off" />
        <TextField name={`${name}.phone`} label={t('contacts.phone')} type="tel" maxLength={40} autoComplete="off" />
      </div>
    </div>
  );
}

import { useState, type FormEvent } from 'react';
import { useTranslation } from 'react-i18next';
import { addDays, dayOf } from '../../../server/domain/civil';
import { useMembership } from '../../lib/me';
import { Button, ButtonRow } from '../../ui/button';
import { Dialog } from '../../ui/dialog';
import { Field } from '../../ui/field';
import { TextInput } from '../../ui/text-input';
import type { Window } from './truck-drafts';

interface Props {
  open: boolean;
  /** For how many stores. */
  count: number;
  onClose: () => void;
  onSet: (window: Window) => void;
}

/** One day and one window for all the chosen, each by its own clock. */
export function SetWindow({ open, count, onClose, onSet }: Props) {
  const { t } = useTranslation('trucks');
  const { timeZone } = useMembership().producer;
  const [window, setWindow] = useState<Window>(() => ({ day: addDays(dayOf(Date.now(), timeZone), 1), from: '08:00', to: '10:00' }));
  const set = (event: FormEvent) => {
    event.preventDefault();
    onSet(window);
    onClose();
  };
  const fields = ['day', 'from', 'to'] as const;
  return (
    <Dialog open={open} title={t('window.title', { count })} onClose={onClose}>
      <form onSubmit={set} className="grid gap-4">
        <p>{t('window.words')}</p>
        <div className="grid grid-cols-2 gap-3">
          {fields.map((part) => (
            <div key={part} className="first:col-span-2">
              <Field label={t(`window.${part}`)}>
                {(control) => (
                  <TextInput
                    {...control}
                    type={part === 'day' ? 'date' : 'time'}
                    required
                    value={window[part]}
                    onChange={({ target }) => setWindow({ ...window, [part]: target.value })}
                  />
                )}
              </Field>
            </div>
          ))}
        </div>
        <ButtonRow>
          <Button type="submit">{t('window.set')}</Button>
          <Button variant="quiet" onClick={onClose}>
            {t('window.cancel')}
          </Button>
        </ButtonRow>
      </form>
    </Dialog>
  );
}

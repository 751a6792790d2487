import { useState, type FormEvent } from 'react';
import { useTranslation } from 'react-i18next';
import { addDays, dayOf } from '../../../server/domain/civil';
import { useMembership } from '../../lib/me';
import { useFaultWords } from '../../form/use-fault-words';
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
  const [tried, setTried] = useState(false);
  const say = useFaultWords();
  const faults = faultsOf(window);
  const set = (event: FormEvent) => {
    event.preventDefault();
    setTried(true);
    if (Object.keys(faults).length > 0) return;
    onSet(window);
    onClose();
  };
  const fields = ['day', 'from', 'to'] as const;
  return (
    <Dialog open={open} title={t('window.title', { count })} onClose={onClose}>
      <form noValidate onSubmit={set} className="grid gap-4">
        <p>{t('window.words')}</p>
        <div className="grid grid-cols-2 gap-3">
          {fields.map((part) => (
            <div key={part} className="first:col-span-2">
              <Field label={t(`window.${part}`)} error={tried && faults[part] ? say(faults[part]) : undefined}>
                {(control) => (
                  <TextInput
                    {...control}
                    type={part === 'day' ? 'date' : 'time'}
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

/** What is wrong with each part, by the keys of validation.json. */
function faultsOf({ day, from, to }: Window): Partial<Window> {
  return {
    ...(!day && { day: 'day' }),
    ...(!from && { from: 'time' }),
    ...(!to && { to: 'time' }),
    ...(from && to && to <= from && { to: 'span-backwards' }),
  };
}

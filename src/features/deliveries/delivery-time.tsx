import { useId, useState } from 'react';
import { useFormContext } from 'react-hook-form';
import { useTranslation } from 'react-i18next';
import { FieldFrame } from '../../form/field-frame';
import { useFaultWords } from '../../form/use-fault-words';
import { instantOfInput, localInputOf } from './local-input';

/** When it was delivered, by the store's clock. */
export function DeliveryTime({ zone }: { zone: string }) {
  const { t } = useTranslation('deliveries');
  const id = useId();
  const say = useFaultWords();
  const { setValue, getValues, getFieldState, formState } = useFormContext<{ at: number }>();
  const [typed, setTyped] = useState(() => localInputOf(getValues('at'), zone));
  const { error } = getFieldState('at', formState);
  const change = (value: string) => {
    setTyped(value);
    setValue('at', instantOfInput(value, zone), { shouldDirty: true, shouldValidate: formState.isSubmitted });
  };
  return (
    <FieldFrame id={id} label={t('record.time')} hint={t('zone', { zone })} fault={error ? say('time') : undefined}>
      {(described) => (
        <input
          {...described}
          type="datetime-local"
          value={typed}
          max={localInputOf(Date.now(), zone)}
          onChange={({ target }) => change(target.value)}
          className="min-h-12 w-full rounded-control border border-edge bg-surface px-3 py-2.5 text-ink aria-invalid:border-rust sm:w-72"
        />
      )}
    </FieldFrame>
  );
}

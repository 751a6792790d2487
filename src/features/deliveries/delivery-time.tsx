import { useState } from 'react';
import { useFormContext } from 'react-hook-form';
import { useTranslation } from 'react-i18next';
import { useFaultWords } from '../../form/use-fault-words';
import { Field } from '../../ui/field';
import { TextInput } from '../../ui/text-input';
import { useNow } from '../stores/use-now';
import { instantOfInput, localInputOf } from './local-input';

/** When it was delivered, by the store's clock. */
export function DeliveryTime({ zone }: { zone: string }) {
  const { t } = useTranslation('deliveries');
  const say = useFaultWords();
  const { setValue, getValues, getFieldState, formState } = useFormContext<{ at: number }>();
  const [typed, setTyped] = useState(() => localInputOf(getValues('at'), zone));
  const now = useNow();
  const { error } = getFieldState('at', formState);
  const change = (value: string) => {
    setTyped(value);
    setValue('at', instantOfInput(value, zone), { shouldDirty: true, shouldValidate: formState.isSubmitted });
  };
  return (
    <Field label={t('record.time')} hint={t('zone', { zone })} error={error ? say('time') : undefined}>
      {(control) => (
        <span className="block sm:w-72">
          <TextInput {...control} type="datetime-local" value={typed} max={localInputOf(now, zone)} onChange={({ target }) => change(target.value)} />
        </span>
      )}
    </Field>
  );
}

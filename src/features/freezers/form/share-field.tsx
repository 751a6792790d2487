import { useState } from 'react';
import { useController } from 'react-hook-form';
import { useFaultWords } from '../../../form/use-fault-words';
import { Field } from '../../../ui/field';
import { TextInput } from '../../../ui/text-input';
import { shareOfText, textOfShare } from './lane-shares';

interface Props {
  name: string;
  label: string;
}

/** A share of the width, typed as percent. */
export function ShareField({ name, label }: Props) {
  const say = useFaultWords();
  const { field, fieldState } = useController({ name });
  const [typed, setTyped] = useState('');
  const share = Number(field.value);
  const change = (text: string) => {
    setTyped(text);
    field.onChange(shareOfText(text));
  };
  return (
    <Field label={label} error={fieldState.error && say(fieldState.error.message)}>
      {(control) => (
        <TextInput
          {...control}
          ref={field.ref}
          name={field.name}
          inputMode="decimal"
          autoComplete="off"
          maxLength={8}
          // What was typed stays as typed until the share changes from elsewhere.
          value={Object.is(shareOfText(typed), share) ? typed : textOfShare(share)}
          onBlur={field.onBlur}
          onChange={({ target }) => change(target.value)}
        />
      )}
    </Field>
  );
}

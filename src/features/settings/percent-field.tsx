import { useState } from 'react';
import { useController } from 'react-hook-form';
import { useFaultWords } from '../../form/use-fault-words';
import { Field } from '../../ui/field';
import { TextInput } from '../../ui/text-input';
import { percentText, shareOf } from './percent';

interface Props {
  name: string;
  label: string;
  hint: string;
}

/** A share, entered in percent. */
export function PercentField({ name, label, hint }: Props) {
  const say = useFaultWords();
  const { field, fieldState } = useController({ name });
  const [text, setText] = useState(() => percentText(field.value));
  const [known, setKnown] = useState<unknown>(field.value);
  // The form may be given other values; what is being typed stays as it is typed.
  if (known !== field.value) {
    setKnown(field.value);
    if (shareOf(text) !== field.value) setText(percentText(field.value));
  }
  const type = (typed: string) => {
    setText(typed);
    field.onChange(shareOf(typed));
  };
  return (
    <Field label={label} hint={hint} error={fieldState.error && say(fieldState.error.message)}>
      {(control) => (
        <span className="flex max-w-32 items-center gap-2">
          <TextInput {...control} ref={field.ref} name={name} inputMode="decimal" autoComplete="off" maxLength={6} value={text} onBlur={field.onBlur} onChange={({ target }) => type(target.value)} />
          <span aria-hidden>%</span>
        </span>
      )}
    </Field>
  );
}

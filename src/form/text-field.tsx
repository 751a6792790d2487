import type { ComponentProps } from 'react';
import { Field } from '../ui/field';
import { TextArea } from '../ui/text-area';
import { TextInput } from '../ui/text-input';
import { useField } from './use-field';

type Native = Pick<ComponentProps<'input'>, 'type' | 'autoComplete' | 'inputMode' | 'maxLength' | 'autoFocus' | 'lang' | 'min' | 'max'>;

interface Props extends Native {
  name: string;
  label: string;
  hint?: string;
  /** More than one makes it a box for words. */
  lines?: number;
  /** What the body gets when nothing was entered; an empty text unless said. */
  none?: { value: null | undefined };
}

/** A line or a box of text. */
export function TextField({ name, label, hint, lines = 1, none, type, autoComplete, inputMode, ...native }: Props) {
  const { bound, fault } = useField(name, none);
  return (
    <Field label={label} hint={hint} error={fault}>
      {(control) =>
        lines > 1 ? (
          <TextArea {...bound} {...control} {...pick(native)} rows={lines} />
        ) : (
          <TextInput {...bound} {...control} {...native} type={type} autoComplete={autoComplete} inputMode={inputMode} />
        )
      }
    </Field>
  );
}

const pick = ({ maxLength, autoFocus, lang }: Native) => ({ maxLength, autoFocus, lang });

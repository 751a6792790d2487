import { useId } from 'react';
import { useFormContext } from 'react-hook-form';
import { FieldFrame } from '../../form/field-frame';
import { useFaultWords } from '../../form/use-fault-words';

interface Props {
  name: string;
  label: string;
}

/** A count of bags; nothing entered is none. */
export function BagsField({ name, label }: Props) {
  const id = useId();
  const say = useFaultWords();
  const { register, getFieldState, formState } = useFormContext();
  const { error } = getFieldState(name, formState);
  return (
    <FieldFrame id={id} label={label} fault={error ? say(error.message) : undefined}>
      {(described) => (
        <input
          {...register(name, { setValueAs: (value: unknown) => (value === '' ? 0 : Number(value)) })}
          {...described}
          type="text"
          inputMode="numeric"
          onFocus={({ target }) => target.select()}
          className="min-h-12 w-full rounded-control border border-edge bg-surface px-3 py-2.5 text-ink aria-invalid:border-rust"
        />
      )}
    </FieldFrame>
  );
}

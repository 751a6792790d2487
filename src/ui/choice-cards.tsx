import { useId, type ReactNode } from 'react';
import { FieldError } from './field';

export interface Choice<V extends string> {
  value: V;
  title: string;
  hint?: string;
  icon?: ReactNode;
}

interface Props<V extends string> {
  legend: string;
  hint?: string;
  error?: string;
  /** The form's name for the answer. */
  name: string;
  choices: readonly Choice<V>[];
  value: V | null;
  onChange: (value: V) => void;
}

/** One of a few, as large targets; native radios, so the arrow keys work as they do everywhere. */
export function ChoiceCards<V extends string>({ legend, hint, error, name, choices, value, onChange }: Props<V>) {
  const id = useId();
  const describedBy = [error && `${id}-error`, hint && `${id}-hint`].filter(Boolean).join(' ') || undefined;
  return (
    <fieldset aria-describedby={describedBy}>
      <legend className="font-semibold">{legend}</legend>
      {hint && (
        <p id={`${id}-hint`} className="text-body text-ink-3">
          {hint}
        </p>
      )}
      <div className="mt-2 grid gap-2 sm:grid-cols-2">
        {choices.map((choice) => (
          <Card key={choice.value} choice={choice} name={name} checked={choice.value === value} onChange={onChange} />
        ))}
      </div>
      {error && <FieldError id={`${id}-error`}>{error}</FieldError>}
    </fieldset>
  );
}

interface CardProps<V extends string> {
  choice: Choice<V>;
  name: string;
  checked: boolean;
  onChange: (value: V) => void;
}

const Card = <V extends string>({ choice: { value, title, hint, icon }, name, checked, onChange }: CardProps<V>) => (
  <label className="flex min-h-14 cursor-pointer items-center gap-3 rounded-card border border-edge bg-surface px-4 py-2.5 hover:border-fjord has-checked:border-fjord has-checked:bg-fjord-tint has-checked:outline-1 has-checked:outline-fjord has-focus-visible:outline-2 has-focus-visible:outline-offset-2 has-focus-visible:outline-fjord">
    <input type="radio" name={name} value={value} checked={checked} onChange={() => onChange(value)} className="size-5 shrink-0 accent-fjord outline-none" />
    {icon && <span className="shrink-0 text-fjord">{icon}</span>}
    <span className="min-w-0">
      <span className="block font-semibold">{title}</span>
      {hint && <span className="block text-small text-ink-2">{hint}</span>}
    </span>
  </label>
);

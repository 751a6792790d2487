import type { InputHTMLAttributes } from 'react';
import { FieldFrame } from './field-frame';
import { useField } from './use-field';

type Native = Pick<
  InputHTMLAttributes<HTMLInputElement>,
  'type' | 'autoComplete' | 'inputMode' | 'maxLength' | 'autoFocus' | 'lang' | 'min' | 'max'
>;

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
export function TextField({ name, label, hint, lines = 1, none, type = 'text', ...native }: Props) {
  const { id, control, fault } = useField(name, none);
  return (
    <FieldFrame id={id} label={label} hint={hint} fault={fault}>
      {(described) =>
        lines > 1 ? (
          <textarea {...control} {...described} {...native} rows={lines} className={box} />
        ) : (
          <input {...control} {...described} {...native} type={type} className={box} />
        )
      }
    </FieldFrame>
  );
}

const box = 'min-h-12 w-full rounded-control border border-edge bg-surface px-3 py-2.5 text-ink aria-invalid:border-rust';

import { useId, type ReactNode } from 'react';

/** What ties a control to its label, hint and error: spread it on the control. */
export interface FieldControl {
  id: string;
  'aria-describedby': string | undefined;
  'aria-invalid': true | undefined;
}

interface Props {
  label: string;
  hint?: string;
  error?: string;
  /** Where the form knows the control by an id of its own. */
  id?: string;
  children: (control: FieldControl) => ReactNode;
}

/** Label and hint above, error below. */
export function Field({ label, hint, error, id, children }: Props) {
  const own = useId();
  const control = id ?? own;
  const hintId = hint ? `${control}-hint` : null;
  const errorId = error ? `${control}-error` : null;
  return (
    <div>
      <label htmlFor={control} className="block font-semibold">
        {label}
      </label>
      {hintId && (
        <p id={hintId} className="text-body text-ink-3">
          {hint}
        </p>
      )}
      <div className="mt-1">
        {children({
          id: control,
          'aria-describedby': [errorId, hintId].filter(Boolean).join(' ') || undefined,
          'aria-invalid': error ? true : undefined,
        })}
      </div>
      {errorId && <FieldError id={errorId}>{error}</FieldError>}
    </div>
  );
}

export const FieldError = ({ id, children }: { id: string; children: ReactNode }) => (
  <p id={id} className="mt-1 text-body font-semibold text-rust">
    {children}
  </p>
);

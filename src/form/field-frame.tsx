import type { ReactNode } from 'react';

interface Described {
  id: string;
  'aria-invalid': true | undefined;
  'aria-describedby': string | undefined;
}

interface Props {
  id: string;
  label: string;
  hint?: string;
  fault?: string;
  children: (described: Described) => ReactNode;
}

/** Label above, hint and fault below, tied to the control for those who hear the page. */
export function FieldFrame({ id, label, hint, fault, children }: Props) {
  const hintId = hint ? `${id}-hint` : undefined;
  const faultId = fault ? `${id}-fault` : undefined;
  const describedBy = [faultId, hintId].filter(Boolean).join(' ') || undefined;
  return (
    <div>
      <label htmlFor={id} className="mb-1 block font-semibold">
        {label}
      </label>
      {children({ id, 'aria-invalid': fault ? true : undefined, 'aria-describedby': describedBy })}
      {fault && (
        <p id={faultId} className="mt-1 font-semibold text-rust">
          {fault}
        </p>
      )}
      {hint && (
        <p id={hintId} className="mt-1 text-small text-ink-3">
          {hint}
        </p>
      )}
    </div>
  );
}

import { useId, type ReactNode } from 'react';

interface Props {
  title: string;
  children: ReactNode;
}

/** A part of a long form, with what it is about. */
export function FormSection({ title, children }: Props) {
  const id = useId();
  return (
    <section aria-labelledby={id} className="grid gap-4 border-t border-rule pt-5">
      <h2 id={id} className="text-lead font-bold">
        {title}
      </h2>
      {children}
    </section>
  );
}

import { useEffect, useRef, type FormEvent, type ReactNode } from 'react';
import { FormProvider, type FieldError, type FieldValues } from 'react-hook-form';
import { useTranslation } from 'react-i18next';
import { FormPending } from './form-pending';
import { ProblemNote } from './problem-note';
import type { ContractForm } from './use-contract-form';
import { useFaultWords } from './use-fault-words';

interface Props<V extends FieldValues, S extends FieldValues> {
  form: ContractForm<V, S>;
  className?: string;
  /** What was done, said once the server has it. */
  done?: string;
  children: ReactNode;
}

/** The shell of every form: fields, what is wrong with them, what the server refused, what was done. */
export function Form<V extends FieldValues, S extends FieldValues>({ form, className = '', done, children }: Props<V, S>) {
  const { fields, problem, pending, submit } = form;
  const send = (event: FormEvent) => {
    event.preventDefault();
    if (!pending) void submit();
  };
  const faults = listOf(fields.formState.errors);
  return (
    <FormProvider {...fields}>
      <FormPending value={pending}>
        <form noValidate onSubmit={send} className={`grid gap-4 ${className}`}>
          {faults.length > 1 && <Summary faults={faults} tries={fields.formState.submitCount} />}
          {problem && !(problem.type === 'bad-input' && faults.length > 0) && <ProblemNote problem={problem} />}
          {children}
          <p role="status" className="text-ink-2 empty:hidden">
            {!problem && done}
          </p>
        </form>
      </FormPending>
    </FormProvider>
  );
}

/** Every fault in one place, each leading to its field. */
function Summary({ faults, tries }: { faults: FieldError[]; tries: number }) {
  const { t } = useTranslation();
  const say = useFaultWords();
  const box = useRef<HTMLDivElement>(null);
  useEffect(() => box.current?.focus(), [tries]);
  return (
    <div ref={box} tabIndex={-1} role="alert" className="rounded-control border border-rust bg-rust-tint px-4 py-3">
      <p className="font-semibold text-rust">{t('form.summary', { count: faults.length })}</p>
      <ul className="mt-1 list-disc pl-5">
        {faults.map((fault, i) => (
          <li key={i}>
            <button type="button" className="text-left underline underline-offset-4" onClick={() => fault.ref?.focus?.()}>
              {[labelOf(fault), say(fault.message)].filter(Boolean).join(': ')}
            </button>
          </li>
        ))}
      </ul>
    </div>
  );
}

const labelOf = ({ ref }: FieldError): string =>
  ref instanceof HTMLInputElement || ref instanceof HTMLTextAreaElement || ref instanceof HTMLSelectElement
    ? (ref.labels?.[0]?.textContent ?? '')
    : '';

/** The leaves of the errors' tree, which follows the shape of the body. */
function listOf(errors: object): FieldError[] {
  return Object.values(errors).flatMap((error: unknown) => {
    if (typeof error !== 'object' || error === null || error instanceof Element) return [];
    return 'type' in error && typeof error.type === 'string' ? [error as FieldError] : listOf(error);
  });
}

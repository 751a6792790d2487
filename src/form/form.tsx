import { useEffect, useRef, type FormEvent, type ReactNode } from 'react';
import { FormProvider, type FieldError, type FieldValues } from 'react-hook-form';
import { useTranslation } from 'react-i18next';
import type { Problem } from '../api/call';
import { ChangedMeanwhile, type Meanwhile } from './changed-meanwhile';
import { FormPending } from './form-pending';
import { ProblemNote } from './problem-note';
import type { ContractForm } from './use-contract-form';
import { useFaultWords } from './use-fault-words';

interface Props<V extends FieldValues, S extends FieldValues, N extends FieldValues> {
  form: ContractForm<V, S>;
  /** For a form that sends a `version`. */
  meanwhile?: Meanwhile<N>;
  className?: string;
  /** What was done, said once the server has it. */
  done?: string;
  children: ReactNode;
}

/** The shell of every form: fields, what is wrong with them, what the server refused, what was done. */
export function Form<V extends FieldValues, S extends FieldValues, N extends FieldValues>({ form, meanwhile, className = '', done, children }: Props<V, S, N>) {
  const { fields, problem, pending, submit } = form;
  const send = (event: FormEvent) => {
    event.preventDefault();
    if (!pending) void submit();
  };
  const faults = listOf(fields.formState.errors).sort(byPlace);
  return (
    <FormProvider {...fields}>
      <FormPending value={pending}>
        <form noValidate onSubmit={send} className={`grid gap-4 ${className}`}>
          {faults.length > 1 && <Summary faults={faults} tries={fields.formState.submitCount} />}
          {problem && !(problem.type === 'bad-input' && faults.length > 0) && <Refused problem={problem} meanwhile={meanwhile} />}
          {children}
          <p role="status" className="text-ink-2 empty:hidden">
            {!problem && done}
          </p>
        </form>
      </FormPending>
    </FormProvider>
  );
}

/** At the top of the form, where whoever pressed the button below is brought. */
function Refused<N extends FieldValues>({ problem, meanwhile }: { problem: Problem; meanwhile: Meanwhile<N> | undefined }) {
  const box = useRef<HTMLDivElement>(null);
  useEffect(() => box.current?.focus(), [problem]);
  return (
    <div ref={box} tabIndex={-1} className="grid gap-4">
      {meanwhile && problem.type === 'changed-meanwhile' ? <ChangedMeanwhile problem={problem} {...meanwhile} /> : <ProblemNote problem={problem} />}
    </div>
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

/** From top to bottom; what is at no one place comes last. */
function byPlace({ ref: a }: FieldError, { ref: b }: FieldError): number {
  if (!(a instanceof Element) || !(b instanceof Element)) return Number(b instanceof Element) - Number(a instanceof Element);
  return a.compareDocumentPosition(b) & Node.DOCUMENT_POSITION_FOLLOWING ? -1 : 1;
}

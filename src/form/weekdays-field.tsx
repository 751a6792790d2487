import { useId } from 'react';
import { useController } from 'react-hook-form';
import type { Weekday } from '../../server/contract/words';
import { useFormat } from '../lib/format';
import { FieldError } from '../ui/field';
import { useFaultWords } from './use-fault-words';

interface Props {
  name: string;
  label: string;
  hint?: string;
}

const week = [1, 2, 3, 4, 5, 6, 7] as const satisfies Weekday[];

/** Any of the seven days; in the body in the week's order. */
export function WeekdaysField({ name, label, hint }: Props) {
  const id = useId();
  const { weekdayName } = useFormat();
  const say = useFaultWords();
  const { field, fieldState } = useController({ name });
  const chosen: Weekday[] = Array.isArray(field.value) ? field.value : [];
  const toggle = (day: Weekday) => field.onChange(week.filter((one) => chosen.includes(one) !== (one === day)));
  const describedBy = [fieldState.error && `${id}-error`, hint && `${id}-hint`].filter(Boolean).join(' ') || undefined;
  return (
    <fieldset aria-describedby={describedBy} className="min-w-0">
      <legend className="font-semibold">{label}</legend>
      {hint && (
        <p id={`${id}-hint`} className="text-body text-ink-3">
          {hint}
        </p>
      )}
      <div className="mt-1 grid grid-cols-4 gap-x-2 sm:grid-cols-7">
        {week.map((day) => (
          <label key={day} className="flex min-h-12 min-w-0 cursor-pointer items-center gap-2">
            <input
              ref={day === 1 ? field.ref : undefined}
              type="checkbox"
              checked={chosen.includes(day)}
              onChange={() => toggle(day)}
              onBlur={field.onBlur}
              aria-label={weekdayName(day)}
              className="size-5 shrink-0 accent-fjord"
            />
            <span aria-hidden className="block first-letter:uppercase">
              {weekdayName(day, 'short')}
            </span>
          </label>
        ))}
      </div>
      {fieldState.error && <FieldError id={`${id}-error`}>{say(fieldState.error.message)}</FieldError>}
    </fieldset>
  );
}

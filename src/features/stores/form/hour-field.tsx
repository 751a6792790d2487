import { useController } from 'react-hook-form';
import { useTranslation } from 'react-i18next';
import { useFaultWords } from '../../../form/use-fault-words';
import { useFormat } from '../../../lib/format';
import { Field } from '../../../ui/field';
import { Select } from '../../../ui/select';

interface Props {
  name: string;
  label: string;
  /** The first and the last hour to choose from. */
  from: number;
  to: number;
}

const hourMs = 3_600_000;
const endOfDay = 24;

/** An hour of the day as a number, by half hours. */
export function HourField({ name, label, from, to }: Props) {
  const { t } = useTranslation('store-form');
  const { time } = useFormat('UTC');
  const say = useFaultWords();
  const { field, fieldState } = useController({ name });
  return (
    <Field label={label} error={fieldState.error && say(fieldState.error.message)}>
      {(control) => (
        <Select {...field} {...control} onChange={({ target }) => field.onChange(Number(target.value))}>
          {hoursWith(from, to, Number(field.value)).map((hour) => (
            <option key={hour} value={hour}>
              {hour === endOfDay ? t('open.midnight') : time(hour * hourMs)}
            </option>
          ))}
        </Select>
      )}
    </Field>
  );
}

/** The half hours, and what is set now where it is none of them. */
function hoursWith(from: number, to: number, now: number): number[] {
  const halves = Array.from({ length: (to - from) * 2 + 1 }, (_, i) => from + i / 2);
  return [...new Set([...halves, now])].toSorted((a, b) => a - b);
}

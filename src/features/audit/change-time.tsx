import { useFormat } from '../../lib/format';
import { useMembership } from '../../lib/me';

/** With its year, in the producer's time zone. */
export function ChangeTime({ at }: { at: number }) {
  const format = useFormat(useMembership().producer.timeZone);
  return (
    <>
      <span className="block whitespace-nowrap">{format.longDate(at)}</span>
      <span className="block text-small font-normal text-ink-3">{format.time(at)}</span>
    </>
  );
}

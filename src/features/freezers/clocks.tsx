import { useMembership } from '../../lib/me';
import { zoneName } from '../../lib/zones';
import { useStoreWords, type StoreWords } from '../stores/use-store-words';

interface Props {
  /** The store's time zone. */
  zone: string;
  now: number;
  say: (words: StoreWords) => string;
}

/** A time by the producer's clock; where the store's says something else, that too, with its zone named. */
export function Clocks({ zone, now, say }: Props) {
  const here = useStoreWords(useMembership().producer.timeZone, now);
  const there = useStoreWords(zone, now);
  return (
    <>
      <span className="block first-letter:uppercase">{say(here)}</span>
      {say(there) !== say(here) && (
        <span className="block text-small text-ink-3 first-letter:uppercase">
          {say(there)}, {zoneName(zone, there.locale)}
        </span>
      )}
    </>
  );
}

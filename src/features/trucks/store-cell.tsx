import { useTranslation } from 'react-i18next';
import { Link } from 'react-router-dom';
import type { TruckRow } from '../../../server/contract/trucks';
import { useMembership } from '../../lib/me';
import { paths } from '../../paths';
import { zoneName } from '../../lib/zones';

interface Props {
  store: TruckRow['store'];
  chosen: boolean;
  /** `range` is everything from the row chosen before. */
  onChoose: (on: boolean, range: boolean) => void;
}

/** The store, its box to choose it, and its clock where that is not the producer's. */
export function StoreCell({ store: { id, name, city, district, timeZone }, chosen, onChoose }: Props) {
  const { t, i18n } = useTranslation('trucks');
  const { slug, timeZone: ours } = useMembership().producer;
  return (
    <span className="flex items-start gap-1">
      <label className="-my-3 -ml-3 grid size-12 shrink-0 cursor-pointer place-items-center">
        <input
          type="checkbox"
          checked={chosen}
          aria-label={t('choose', { store: name })}
          onChange={({ target, nativeEvent }) => onChoose(target.checked, nativeEvent instanceof MouseEvent && nativeEvent.shiftKey)}
          className="size-5 scroll-my-48 accent-fjord"
        />
      </label>
      <span className="min-w-0">
        <Link to={paths.store(slug, id)} className="text-ink underline decoration-edge underline-offset-4 hover:decoration-ink">
          {name}
        </Link>
        <span className="block text-small font-normal text-ink-3">{t('place', { city, district })}</span>
        {timeZone !== ours && <span className="block text-small font-normal text-ink-3">{zoneName(timeZone, i18n.language)}</span>}
      </span>
    </span>
  );
}

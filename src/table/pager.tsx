import { useTranslation } from 'react-i18next';
import { Link, useSearchParams } from 'react-router-dom';
import { linkClass } from '../ui/link-class';

interface Props {
  /** The cursor of the page that follows; null on the last. */
  next: string | null;
}

/** Keyset paging by links: on to the next page, or back to the first. */
export function Pager({ next }: Props) {
  const { t } = useTranslation();
  const [search] = useSearchParams();
  const to = (after: string | null) => {
    const wanted = new URLSearchParams(search);
    wanted.delete('after');
    if (after) wanted.set('after', after);
    return { search: wanted.toString() };
  };
  const later = search.has('after');
  if (!next && !later) return null;
  return (
    <div className="flex gap-4 py-4">
      {later && (
        <Link to={to(null)} className={linkClass()}>
          {t('first')}
        </Link>
      )}
      {next && (
        <Link to={to(next)} className={linkClass()}>
          {t('next')}
        </Link>
      )}
    </div>
  );
}

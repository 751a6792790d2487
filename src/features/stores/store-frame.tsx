import type { ReactNode } from 'react';
import { ChevronLeft } from 'lucide-react';
import { useTranslation } from 'react-i18next';
import { Link } from 'react-router-dom';
import type { StorePage } from '../../../server/contract/stores';
import { useMembership } from '../../lib/me';
import { paths } from '../../paths';

interface Props {
  store: StorePage['store'];
  /** For a form or a list in one column. */
  narrow?: boolean;
  children: ReactNode;
}

/** Around a page about one store, with the way back to it; the producer's people see it without a margin of its own. */
export function StoreFrame({ store, narrow = false, children }: Props) {
  const { t } = useTranslation('store');
  const { producer } = useMembership();
  return (
    <div className={usePagePadding()}>
      <div className={narrow ? 'mx-auto max-w-2xl' : undefined}>
        <Link to={paths.store(producer.slug, store.id)} className="-ml-1 inline-flex min-h-12 items-center gap-1 font-semibold text-fjord">
          <ChevronLeft aria-hidden size={20} />
          {t('back', { store: store.name })}
        </Link>
        {children}
      </div>
    </div>
  );
}

/** The staff's layout leaves the margins to the page, the stores' own has them. */
export const usePagePadding = () => (useMembership().side === 'producer' ? 'mx-auto max-w-[1160px] px-4 py-5 sm:px-6' : '');

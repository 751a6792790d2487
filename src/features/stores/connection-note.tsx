import { useSyncExternalStore } from 'react';
import type { UseQueryResult } from '@tanstack/react-query';
import { WifiOff } from 'lucide-react';
import { useTranslation } from 'react-i18next';
import { useFormat } from '../../lib/format';

interface Props {
  asked: Pick<UseQueryResult, 'dataUpdatedAt' | 'isRefetchError'>;
  now: number;
}

/** Says how old the page is while the newest cannot be had; lies over the page, so that nothing read moves. */
export function ConnectionNote({ asked, now }: Props) {
  const { t } = useTranslation('store');
  const format = useFormat();
  const online = useOnline();
  const cut = !online || asked.isRefetchError;
  return (
    <div role="status" className="pointer-events-none fixed inset-x-0 bottom-36 z-20 flex justify-center px-4 lg:bottom-6">
      {cut && (
        <p className="flex items-center gap-2 rounded-control border border-straw bg-straw-tint px-4 py-2.5 text-base font-semibold text-straw">
          <WifiOff aria-hidden size={18} className="shrink-0" />
          {t(online ? 'unreached' : 'offline', { ago: format.ago(asked.dataUpdatedAt, now) })}
        </p>
      )}
    </div>
  );
}

function useOnline(): boolean {
  return useSyncExternalStore(
    (changed) => {
      addEventListener('online', changed);
      addEventListener('offline', changed);
      return () => {
        removeEventListener('online', changed);
        removeEventListener('offline', changed);
      };
    },
    () => navigator.onLine,
  );
}

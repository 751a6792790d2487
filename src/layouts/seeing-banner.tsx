import { Suspense, useEffect, useRef, type RefObject } from 'react';
import { useQuery } from '@tanstack/react-query';
import { Eye } from 'lucide-react';
import { useTranslation } from 'react-i18next';
import type { Result } from '../../server/contract/endpoint';
import { api } from '../../server/contract/index';
import { useAct } from '../api/act';
import { paths } from '../paths';
import { seeingQuery } from './use-seeing';

type Seeing = NonNullable<Result<typeof api.auth.readSeeing>['seeing']>;

/** Over every page of somebody who sees as somebody else; for all others nothing, and one small question a minute. */
export function SeeingBanner() {
  const { data } = useQuery({
    ...seeingQuery,
    refetchInterval: ({ state }) => Math.min(seeingQuery.staleTime, untilEnd(state.data?.seeing)),
  });
  const seeing = data?.seeing ?? null;
  const frame = useRef<HTMLDivElement>(null);
  useEnded(seeing !== null);
  useMeasured(frame);
  return (
    <div ref={frame} role="status" className="sticky top-0 z-40">
      {seeing && (
        <Suspense fallback={null}>
          <Banner seeing={seeing} />
        </Suspense>
      )}
    </div>
  );
}

/** A moment after it ends by itself, the server is asked. */
const untilEnd = (seeing: Seeing | null | undefined): number => (seeing ? Math.max(1000, seeing.until + 500 - Date.now()) : seeingQuery.staleTime);

/** Once it has ended by itself, the page still shows what the other saw: begin anew. */
function useEnded(seeing: boolean) {
  const was = useRef(false);
  useEffect(() => {
    if (was.current && !seeing) window.location.assign(paths.home());
    was.current = seeing;
  }, [seeing]);
}

/** What stands still below it begins at `--banner`. */
function useMeasured(frame: RefObject<HTMLElement | null>) {
  useEffect(() => {
    const { style } = document.documentElement;
    const measured = new ResizeObserver(([entry]) => style.setProperty('--banner', `${entry?.borderBoxSize[0]?.blockSize ?? 0}px`));
    if (frame.current) measured.observe(frame.current);
    return () => {
      measured.disconnect();
      style.removeProperty('--banner');
    };
  }, [frame]);
}

function Banner({ seeing: { producer, memberId, name } }: { seeing: Seeing }) {
  const { t } = useTranslation(['seeing', 'problems']);
  const end = useAct(api.auth.endSeeing, []);
  const stop = () => end.mutate({}, { onSuccess: () => window.location.assign(paths.person(producer, memberId)) });
  return (
    <section aria-label={t('label')} className="flex flex-wrap items-center gap-x-4 gap-y-1 bg-ink px-4 py-1.5 text-paper print:hidden">
      <p className="flex min-w-0 grow basis-60 items-center gap-2.5">
        <Eye aria-hidden size={20} className="shrink-0" />
        <span className="min-w-0 wrap-anywhere">
          {t('words', { name })}
          {end.error && ` ${t(`problems:${end.error.type}.title`)}`}
        </span>
      </p>
      <button
        type="button"
        aria-disabled={end.isPending || undefined}
        onClick={stop}
        className="min-h-11 rounded-control border border-paper px-4 font-semibold text-paper hover:bg-paper hover:text-ink focus-visible:outline-paper"
      >
        {t('stop')}
      </button>
    </section>
  );
}

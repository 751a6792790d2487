import { useTranslation } from 'react-i18next';
import type { Request } from '../../../server/contract/requests';
import { useMembership } from '../../lib/me';
import { useFormat } from '../../lib/format';
import { StateTag } from './state-tag';
import { useZone } from './use-zone';

/** What is wrong and where, in the words of whoever opened it. */
export function RequestHead({ request }: { request: Request }) {
  const { t } = useTranslation('requests');
  const { side } = useMembership();
  const format = useFormat(useZone(request));
  const where = request.freezer ? t('one.at', { store: request.store, freezer: request.freezer }) : request.store;
  const day = request.scheduledDay ? format.day(request.scheduledDay) : '';
  return (
    <header>
      <div className="flex flex-wrap items-start justify-between gap-x-4 gap-y-2">
        <h1 className="text-title font-bold" tabIndex={-1}>
          {t(`kinds.${request.kind}`)}
        </h1>
        <StateTag state={request.state} day={request.scheduledDay} />
      </div>
      <p className="text-ink-2">
        {where} · {t('number', { number: request.number })}
      </p>
      {side === 'store' && <p className="mt-3 font-semibold">{t(`one.told.${request.state}`, { day })}</p>}
      <section className="mt-5 border-t border-rule pt-4">
        <p className="text-small text-ink-3">
          {t('one.opened-by', { name: request.openedBy?.name ?? t('entries.nilas'), when: format.when(request.openedAt) })}
          {side === 'producer' && ` · ${t(`one.store-language.${request.language}`)}`}
        </p>
        {request.words ? (
          <p className="mt-1 whitespace-pre-line break-words">{request.words}</p>
        ) : (
          <p className="mt-1 text-ink-3">{t('one.no-words')}</p>
        )}
      </section>
    </header>
  );
}

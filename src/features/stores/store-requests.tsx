import { useTranslation } from 'react-i18next';
import type { StorePage } from '../../../server/contract/stores';
import { liveStates, type RequestState } from '../../../server/contract/words';
import { Section } from '../../ui/section';
import { RequestLinks } from './request-links';

interface Props {
  found: StorePage;
  now: number;
}

const isLive = (state: RequestState): boolean => liveStates.some((live) => live === state);

/** Who is fixing it: what is open, and what ended lately. */
export function StoreRequests({ found, now }: Props) {
  const { t } = useTranslation('store');
  const live = found.requests.filter(({ state }) => isLive(state));
  const ended = found.requests.filter(({ state }) => !isLive(state));
  return (
    <Section title={t('requests.open')}>
      {live.length === 0 && <p className="py-3 text-ink-2">{t('requests.none')}</p>}
      <RequestLinks requests={live} now={now} />
      {ended.length > 0 && (
        <>
          <h3 className="border-b border-rule pt-5 pb-2.5 font-bold">{t('requests.ended')}</h3>
          <RequestLinks requests={ended} now={now} />
        </>
      )}
    </Section>
  );
}

import { useSuspenseQuery } from '@tanstack/react-query';
import { CircleCheck } from 'lucide-react';
import { useTranslation } from 'react-i18next';
import { Link } from 'react-router-dom';
import { api } from '../../../server/contract/index';
import type { StorePage } from '../../../server/contract/stores';
import { q } from '../../api/query';
import { ProblemNote } from '../../form/problem-note';
import { useMembership } from '../../lib/me';
import { paths } from '../../paths';
import { Button, buttonClass } from '../../ui/button';
import { DeskHours } from '../requests/desk-hours';
import { StepHeading } from './step-heading';
import type { PhotoSending } from './use-photo-sending';

interface Props {
  requestId: string;
  store: StorePage['store'];
  /** `report` for something wrong, `sooner` for ice asked for. */
  kind?: 'done' | 'sooner';
  sending?: PhotoSending;
}

/** It is filed: its number, what happens next, and what became of the photos. */
export function FiledReport({ requestId, store, kind = 'done', sending }: Props) {
  const { t } = useTranslation(['report', 'requests']);
  const producer = useMembership().producer.slug;
  const { data: request } = useSuspenseQuery(q(api.requests.read, { params: { producer, requestId } }));
  const number = t('requests:number', { number: request.number });
  return (
    <section className="mt-4 rounded-card border border-rule bg-surface p-5">
      <CircleCheck aria-hidden size={32} className="text-kelp" />
      <div className="mt-2">
        <StepHeading>{kind === 'done' ? t('done.title', { number }) : t('sooner.done', { number })}</StepHeading>
      </div>
      <p className="mt-1 text-ink-2">{kind === 'done' ? t('done.words') : t('sooner.done-words')}</p>
      <DeskHours />
      {sending && sending.count > 0 && <Photos requestId={requestId} sending={sending} />}
      <div className="mt-5 flex flex-wrap gap-3">
        <Link className={buttonClass('primary', { size: 'big' })} to={paths.store(producer, store.id)}>{t('done.store')}</Link>
        <Link className={buttonClass('quiet', { size: 'big' })} to={paths.request(producer, requestId)}>
          {t('done.open', { number })}
        </Link>
      </div>
    </section>
  );
}

function Photos({ requestId, sending }: { requestId: string; sending: PhotoSending }) {
  const { t } = useTranslation('report');
  const { count, state, problem } = sending;
  return (
    <div role="status" className="mt-3 empty:hidden">
      {state === 'pending' && <p>{t('done.sending', { count })}</p>}
      {state === 'success' && <p>{t('done.photos', { count })}</p>}
      {state === 'error' && problem && (
        <>
          <p className="mb-2 font-semibold">{t('done.photos-failed')}</p>
          <ProblemNote problem={problem} />
          <div className="mt-2">
            <Button variant="quiet" onClick={() => sending.send(requestId)}>
              {t('done.retry')}
            </Button>
          </div>
        </>
      )}
    </div>
  );
}

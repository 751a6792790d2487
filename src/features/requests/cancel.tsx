import { useState } from 'react';
import { useTranslation } from 'react-i18next';
import { api } from '../../../server/contract/index';
import type { Request } from '../../../server/contract/requests';
import { useAct } from '../../api/act';
import { ProblemNote } from '../../form/problem-note';
import { useMembership } from '../../lib/me';
import { Button } from '../../ui/button';
import { Dialog } from '../../ui/dialog';

/** The store takes its request back, after one question. */
export function Cancel({ request }: { request: Request }) {
  const { t } = useTranslation('requests');
  const { producer } = useMembership();
  const [asking, ask] = useState(false);
  const cancel = useAct(api.requests.cancel, [api.requests.read, api.requests.list, api.stores.read]);
  const take = () =>
    cancel.mutate({ params: { producer: producer.slug, requestId: request.id } }, { onSuccess: () => ask(false) });
  return (
    <div className="mt-6 border-t border-rule pt-5">
      <Button variant="quiet" onClick={() => ask(true)}>
        {t('cancel.button')}
      </Button>
      <Dialog
        open={asking}
        title={t('cancel.title', { number: t('number', { number: request.number }) })}
        onClose={() => ask(false)}
      >
        <p>{t('cancel.words')}</p>
        {cancel.error && <ProblemNote problem={cancel.error} />}
        <div className="mt-4 flex flex-wrap gap-3">
          <Button variant="danger" busy={cancel.isPending} onClick={take}>
            {t('cancel.yes')}
          </Button>
          <Button variant="quiet" onClick={() => ask(false)}>
            {t('cancel.no')}
          </Button>
        </div>
      </Dialog>
    </div>
  );
}

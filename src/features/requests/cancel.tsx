import { useState } from 'react';
import { useTranslation } from 'react-i18next';
import { api } from '../../../server/contract/index';
import type { Request } from '../../../server/contract/requests';
import { useAct } from '../../api/act';
import { Confirm } from '../../form/confirm';
import { useMembership } from '../../lib/me';
import { Button } from '../../ui/button';

/** The store takes its request back, after one question. */
export function Cancel({ request }: { request: Request }) {
  const { t } = useTranslation('requests');
  const [asking, ask] = useState(false);
  return (
    <div className="mt-6 border-t border-rule pt-5">
      <Button variant="quiet" onClick={() => ask(true)}>
        {t('cancel.button')}
      </Button>
      {asking && <Question request={request} onClose={() => ask(false)} />}
    </div>
  );
}

function Question({ request: { id, number }, onClose }: { request: Request; onClose: () => void }) {
  const { t } = useTranslation('requests');
  const { slug } = useMembership().producer;
  const cancel = useAct(api.requests.cancel, [api.requests.read, api.requests.list, api.stores.read]);
  const take = () => cancel.mutate({ params: { producer: slug, requestId: id } }, { onSuccess: onClose });
  return (
    <Confirm
      title={t('cancel.title', { number: t('number', { number }) })}
      yes={t('cancel.yes')}
      no={t('cancel.no')}
      act={cancel}
      onYes={take}
      onClose={onClose}
    >
      <p>{t('cancel.words')}</p>
    </Confirm>
  );
}

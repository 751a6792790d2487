import { useState } from 'react';
import { useTranslation } from 'react-i18next';
import { useNavigate } from 'react-router-dom';
import { row } from '../../../server/contract/ability';
import { api } from '../../../server/contract/index';
import { useAct } from '../../api/act';
import { Confirm } from '../../form/confirm';
import { useAbility, useMembership } from '../../lib/me';
import { paths } from '../../paths';
import { Button } from '../../ui/button';

interface Props {
  storeId: string;
}

/** Takes the next truck away, after asking. */
export function ClearTruck({ storeId }: Props) {
  const { t } = useTranslation('deliveries');
  const [asking, setAsking] = useState(false);
  if (!useAbility().can('delete', row('NextTruck', { storeId }))) return null;
  return (
    <div className="mt-8 border-t border-rule pt-4">
      <Button variant="quiet" size="big" onClick={() => setAsking(true)}>
        {t('next-truck.clear')}
      </Button>
      {asking && <Question storeId={storeId} onClose={() => setAsking(false)} />}
    </div>
  );
}

function Question({ storeId, onClose }: Props & { onClose: () => void }) {
  const { t } = useTranslation('deliveries');
  const navigate = useNavigate();
  const { slug } = useMembership().producer;
  const clear = useAct(api.deliveries.clearNextTruck, [api.stores.read, api.stores.list]);
  const act = () => clear.mutate({ params: { producer: slug, storeId } }, { onSuccess: () => void navigate(paths.store(slug, storeId)) });
  return (
    <Confirm
      title={t('next-truck.clear-ask')}
      yes={t('next-truck.clear-yes')}
      no={t('next-truck.clear-no')}
      variant="primary"
      act={clear}
      onYes={act}
      onClose={onClose}
    >
      <p>{t('next-truck.clear-words')}</p>
    </Confirm>
  );
}

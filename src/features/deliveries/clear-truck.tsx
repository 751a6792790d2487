import { useState } from 'react';
import { useTranslation } from 'react-i18next';
import { useNavigate } from 'react-router-dom';
import { row } from '../../../server/contract/ability';
import { api } from '../../../server/contract/index';
import { useAct } from '../../api/act';
import { ProblemNote } from '../../form/problem-note';
import { useAbility, useMembership } from '../../lib/me';
import { paths } from '../../paths';
import { Button } from '../../ui/button';
import { Dialog } from '../../ui/dialog';

/** Takes the next truck away, after asking. */
export function ClearTruck({ storeId }: { storeId: string }) {
  const { t } = useTranslation('deliveries');
  const [asking, setAsking] = useState(false);
  const navigate = useNavigate();
  const { slug } = useMembership().producer;
  const ability = useAbility();
  const clear = useAct(api.deliveries.clearNextTruck, [api.stores.read, api.stores.list]);
  if (!ability.can('delete', row('NextTruck', { storeId }))) return null;
  const act = () =>
    clear.mutate({ params: { producer: slug, storeId } }, { onSuccess: () => void navigate(paths.store(slug, storeId)) });
  return (
    <div className="mt-8 border-t border-rule pt-4">
      <Button variant="quiet" size="big" onClick={() => setAsking(true)}>
        {t('next-truck.clear')}
      </Button>
      <Dialog open={asking} title={t('next-truck.clear-ask')} onClose={() => setAsking(false)}>
        <p>{t('next-truck.clear-words')}</p>
        {clear.error && <ProblemNote problem={clear.error} />}
        <div className="mt-4 flex flex-wrap gap-3">
          <Button busy={clear.isPending} onClick={act}>
            {t('next-truck.clear-yes')}
          </Button>
          <Button variant="quiet" onClick={() => setAsking(false)}>
            {t('next-truck.clear-no')}
          </Button>
        </div>
      </Dialog>
    </div>
  );
}

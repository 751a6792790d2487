import { useTranslation } from 'react-i18next';
import { Link } from 'react-router-dom';
import type { District } from '../../../server/contract/districts';
import type { Result } from '../../../server/contract/endpoint';
import { api } from '../../../server/contract/index';
import { useAct } from '../../api/act';
import { page } from '../../api/page';
import { RetireDialog } from '../../form/retire-dialog';
import { useFormat } from '../../lib/format';
import { useAbility, useMembership } from '../../lib/me';
import { paths } from '../../paths';
import { CardTable } from '../../table/card-table';
import { Button } from '../../ui/button';
import { linkClass } from '../../ui/link-class';
import { EmptyState } from '../../ui/states';
import { AccountsFrame } from './accounts-frame';
import { DistrictDialog } from './district-dialog';
import { districtsQueryOf, districtStale } from './districts-query';
import { Named } from './named';
import { RowActs } from './row-acts';
import { useListAct, type ListAct } from './use-list-act';

export const districtsPage = page({
  words: ['accounts', 'validation'],
  queries: ({ params }) => ({ listed: districtsQueryOf(params.producer ?? '') }),
  View: Districts,
});

/** The groups that stores are looked after in. */
function Districts({ listed: { districts } }: { listed: Result<typeof api.districts.list> }) {
  const { t } = useTranslation('accounts');
  const { slug } = useMembership().producer;
  const act = useListAct(districts);
  const change = useAct(api.districts.change, districtStale);
  const add = useAbility().can('create', 'District') && <Button onClick={() => act.start({ kind: 'add' })}>{t('districts.add')}</Button>;
  return (
    <AccountsFrame title={t('districts.title')} lead={t('districts.lead')} action={add} done={act.done}>
      {districts.length === 0 ? (
        <EmptyState title={t('districts.empty')}>{t('districts.empty-words')}</EmptyState>
      ) : (
        <DistrictTable districts={districts} onAct={act.start} />
      )}
      <DistrictDialog open={act.adding || act.changing !== null} district={act.changing} onClose={act.close} onDone={act.finish} />
      {act.retiring && (
        <RetireDialog
          thing={act.retiring}
          words={{ retire: t('districts.retire'), restore: t('districts.restore') }}
          needed={act.retiring.stores > 0 ? t('districts.needed', { count: act.retiring.stores }) : null}
          send={(districtId, body) => change.mutateAsync({ params: { producer: slug, districtId }, body })}
          source={api.districts.list}
          onClose={act.close}
          onDone={act.finish}
        />
      )}
    </AccountsFrame>
  );
}

function DistrictTable({ districts, onAct }: { districts: District[]; onAct: ListAct['start'] }) {
  const { t } = useTranslation('accounts');
  const { slug } = useMembership().producer;
  const { number } = useFormat();
  const change = useAbility().can('update', 'District');
  const rows = districts.map((district) => ({
    id: district.id,
    cells: [
      <Named key="name" {...district} />,
      number(district.stores),
      <Link key="freezers" to={paths.freezers(slug, `?district=${district.id}`)} aria-label={t('districts.freezers-of', { name: district.name })} className={linkClass()}>
        {t('districts.freezers')}
      </Link>,
      ...(change ? [<RowActs key="acts" of={district} onAct={onAct} />] : []),
    ],
  }));
  const columns = [t('districts.district'), t('stores.title'), t('districts.fleet'), ...(change ? [t('acts')] : [])];
  return <CardTable label={t('districts.title')} columns={columns} rows={rows} />;
}

import { keepPreviousData, useQuery } from '@tanstack/react-query';
import { useTranslation } from 'react-i18next';
import { api } from '../../../../server/contract/index';
import { Problem } from '../../../api/call';
import { q } from '../../../api/query';
import { useMembership } from '../../../lib/me';
import { Button } from '../../../ui/button';
import { Notice } from '../../../ui/notice';
import { Skeleton } from '../../../ui/skeleton';
import { EmptyState } from '../../../ui/states';
import type { FleetMapProps } from './fleet-map';
import { MapAndTable } from './map-and-table';

export function StoresMap({ query }: FleetMapProps) {
  const { t } = useTranslation(['map', 'common', 'problems']);
  const { slug } = useMembership().producer;
  const asked = q(api.freezers.map, { params: { producer: slug }, query }, { everyMs: 60_000 });
  const { data, error, refetch } = useQuery({ ...asked, placeholderData: keepPreviousData });
  if (data?.stores.length === 0) return <EmptyState title={t('empty.title')}>{t('empty.words')}</EmptyState>;
  if (data) return <MapAndTable stores={data.stores} subject={JSON.stringify(query)} />;
  if (!error) return <Skeleton className="h-80 lg:h-150" />;
  const type = error instanceof Problem ? error.type : 'server-error';
  return (
    <Notice tone="bad" role="alert" title={t(`problems:${type}.title`)}>
      <p className="mb-3">{t(`problems:${type}.help`)}</p>
      <Button variant="quiet" onClick={() => void refetch()}>
        {t('common:failed.retry')}
      </Button>
    </Notice>
  );
}

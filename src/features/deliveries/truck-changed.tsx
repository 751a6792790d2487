import { useEffect } from 'react';
import { useTranslation } from 'react-i18next';
import { useParams } from 'react-router-dom';
import type { NextTruck } from '../../../server/contract/deliveries';
import type { Problem } from '../../api/call';
import { queryClient } from '../../api/query';
import { Notice } from '../../ui/notice';
import { storeQueryOf } from '../stores/store-query';
import { useNow } from '../stores/use-now';
import { useStoreWords } from '../stores/use-store-words';

/** What somebody else set meanwhile; null once it is known that they took the truck away. */
export interface Theirs {
  truck: NextTruck | null;
}

interface Props {
  problem: Problem;
  theirs: Theirs | null;
  onLearnt: (theirs: Theirs) => void;
  zone: string;
}

/** Asks what was set meanwhile and says it beside the typed values, which stay. */
export function TruckChanged({ problem, theirs, onLearnt, zone }: Props) {
  const { t } = useTranslation('deliveries');
  const { producer = '', storeId = '' } = useParams();
  const say = useStoreWords(zone, useNow());
  useEffect(() => {
    void queryClient.fetchQuery({ ...storeQueryOf(producer, storeId), staleTime: 0 }).then(({ nextTruck }) => onLearnt({ truck: nextTruck }));
    // Anew for each refusal: a second one tells of a second change.
  }, [problem, producer, storeId, onLearnt]);
  if (!theirs) return null;
  return (
    <Notice tone="caution" role="status" title={theirs.truck ? t('next-truck.changed', { when: say.dayAndWindow(theirs.truck) }) : t('next-truck.changed-none')}>
      {t('next-truck.kept')}
    </Notice>
  );
}

import { useState } from 'react';
import { keepPreviousData, useQuery } from '@tanstack/react-query';
import { useTranslation } from 'react-i18next';
import type { Result } from '../../../../server/contract/endpoint';
import { api } from '../../../../server/contract/index';
import { Problem } from '../../../api/call';
import { q } from '../../../api/query';
import { ProblemNote } from '../../../form/problem-note';
import { useFormat } from '../../../lib/format';
import { useMembership } from '../../../lib/me';
import { SearchBox } from '../../../table/search-box';
import { Skeleton } from '../../../ui/skeleton';
import { useNow } from '../../stores/use-now';
import { PickList } from '../pick-list';

export type FoundSensor = Result<typeof api.sensors.find>['sensors'][number];

interface Props {
  /** What the search begins with. */
  serial: string;
  /** The freezer it will hang in. */
  here: string;
  onChoose: (sensor: FoundSensor) => void;
}

/** A sensor, found by a part of its serial. */
export function SensorSearch({ serial, ...props }: Props) {
  const { t } = useTranslation('freezer-page');
  const [words, setWords] = useState(serial);
  return (
    <section aria-labelledby="which-sensor">
      <h2 id="which-sensor" className="text-lead font-bold">
        {t('search.title')}
      </h2>
      <p className="text-ink-2">{t('search.lead')}</p>
      <search className="mt-2 flex">
        <SearchBox label={t('search.label')} hint={t('search.hint')} value={words} onSearch={setWords} />
      </search>
      {words && <Found words={words} {...props} />}
    </section>
  );
}

function Found({ words, here, onChoose }: Omit<Props, 'serial'> & { words: string }) {
  const { t } = useTranslation('freezer-page');
  const { ago } = useFormat();
  const now = useNow();
  const { slug } = useMembership().producer;
  const { data, error } = useQuery({
    ...q(api.sensors.find, { params: { producer: slug }, query: { q: words } }),
    placeholderData: keepPreviousData,
  });
  if (error instanceof Problem) return <ProblemNote problem={error} />;
  if (!data) return <Skeleton className="mt-3 h-28" />;
  const { sensors } = data;
  if (sensors.length === 0)
    return (
      <p role="status" className="mt-3 text-ink-2">
        {t('search.nothing', { words })}
      </p>
    );
  const placeOf = ({ freezer }: FoundSensor) => {
    if (!freezer) return t('search.free');
    return freezer.id === here ? t('search.here') : t('search.elsewhere', { freezer: freezer.name, store: freezer.store });
  };
  const heard = ({ lastReadingAt }: FoundSensor) => (lastReadingAt === null ? t('search.never') : t('search.heard', { ago: ago(lastReadingAt, now) }));
  const choose = (id: string) => {
    const sensor = sensors.find((one) => one.id === id);
    if (sensor) onChoose(sensor);
  };
  return (
    <div className="mt-3">
      <p role="status" className="sr-only">
        {t('search.count', { count: sensors.length })}
      </p>
      <PickList
        label={t('search.found')}
        items={sensors.map((sensor) => ({ id: sensor.id, title: sensor.serial, hint: `${placeOf(sensor)} ${heard(sensor)}` }))}
        onPick={choose}
      />
      {sensors.length >= most && <p className="mt-2 text-small text-ink-3">{t('search.narrow')}</p>}
    </div>
  );
}

/** As many as one answer holds. */
const most = 20;

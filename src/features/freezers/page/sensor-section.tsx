import { useState } from 'react';
import { useTranslation } from 'react-i18next';
import { Link } from 'react-router-dom';
import { row } from '../../../../server/contract/ability';
import type { FreezerPage } from '../../../../server/contract/freezers';
import { useFormat, type Format } from '../../../lib/format';
import { useAbility, useMembership } from '../../../lib/me';
import { paths } from '../../../paths';
import { Button, buttonClass } from '../../../ui/button';
import { DefinitionList } from '../../../ui/definition-list';
import { Section } from '../../../ui/section';
import { useStoreWords } from '../../stores/use-store-words';
import { MoveSensor } from '../sensor/move-sensor';
import { TakeOff } from './take-off';

interface Props {
  found: FreezerPage;
  now: number;
}

/** The sensor that hangs here, what hung here before, and tying, moving or taking off. */
export function SensorSection({ found, now }: Props) {
  const { t } = useTranslation('freezer-page');
  const { freezer, store, sensors } = found;
  const format = useFormat(store.timeZone);
  return (
    <Section title={t('sensor.title')}>
      {freezer.sensor ? <Now found={found} now={now} /> : <p className="py-3 text-ink-2">{t('sensor.none')}</p>}
      <Acts found={found} />
      {sensors.length > 0 && (
        <>
          <h3 className="pt-4 text-small font-semibold text-ink-3">{t('sensor.history')}</h3>
          <ul className="divide-y divide-rule">
            {sensors.map(({ serial, from, to }) => (
              <li key={`${serial} ${from}`} className="py-2.5">
                <span className="block font-semibold wrap-anywhere">{serial}</span>
                <span className="block text-small text-ink-2">{spanWords({ from, to }, format, t)}</span>
              </li>
            ))}
          </ul>
        </>
      )}
    </Section>
  );
}

const spanWords = ({ from, to }: { from: number; to: number | null }, { longDate }: Format, t: (key: 'sensor.span' | 'sensor.span-open', words: Record<string, string>) => string) =>
  to === null ? t('sensor.span-open', { from: longDate(from) }) : t('sensor.span', { from: longDate(from), to: longDate(to) });

function Now({ found: { freezer, store }, now }: Props) {
  const { t } = useTranslation('freezer-page');
  const say = useStoreWords(store.timeZone, now);
  const { sensor, state } = freezer;
  if (!sensor) return null;
  return (
    <DefinitionList
      items={[
        { term: t('sensor.serial'), detail: <span className="wrap-anywhere">{sensor.serial}</span> },
        { term: t('sensor.probes'), detail: say.list(sensor.probesIn.map((place) => say.inches(place))) },
        { term: t('sensor.heard'), detail: state ? say.ago(state.at) : t('sensor.never') },
        ...(state && state.supplyV !== null ? [{ term: t('sensor.supply'), detail: t('sensor.volts', { volts: say.tenths(state.supplyV) }) }] : []),
      ]}
    />
  );
}

function Acts({ found: { freezer, store } }: Pick<Props, 'found'>) {
  const { t } = useTranslation('freezer-page');
  const [asked, setAsked] = useState<'move' | 'take-off' | null>(null);
  const { slug } = useMembership().producer;
  const ability = useAbility();
  const { sensor } = freezer;
  const mayTie = ability.can('create', row('Install', { storeId: store.id }));
  const mayTakeOff = ability.can('update', row('Install', { storeId: store.id }));
  return (
    <div className="flex flex-wrap gap-3 pt-1 *:grow">
      {mayTie && (
        <Link className={buttonClass(sensor ? 'quiet' : 'primary', { size: 'big' })} to={paths.tieSensor(slug, freezer.id)}>
          {t(sensor ? 'sensor.tie-other' : 'sensor.tie')}
        </Link>
      )}
      {mayTie && sensor && (
        <Button variant="quiet" size="big" onClick={() => setAsked('move')}>
          {t('sensor.move')}
        </Button>
      )}
      {mayTakeOff && sensor && (
        <Button variant="quiet" size="big" onClick={() => setAsked('take-off')}>
          {t('sensor.take-off')}
        </Button>
      )}
      {sensor && <MoveSensor open={asked === 'move'} serial={sensor.serial} from={freezer.id} onClose={() => setAsked(null)} />}
      {sensor && asked === 'take-off' && <TakeOff serial={sensor.serial} freezer={freezer} onClose={() => setAsked(null)} />}
    </div>
  );
}

import { useTranslation } from 'react-i18next';
import { useFormat } from '../lib/format';
import type { SectionLane, SectionProbe } from './section-geometry';

interface Drawn {
  lanes: SectionLane[];
  probes: SectionProbe[];
  airText: string;
  asOf?: string;
}

/** The drawing in sentences: one of what it is, one a lane, one a probe, one of the air. */
export function useSectionSaid({ lanes, probes, airText, asOf }: Drawn): string[] {
  const { t } = useTranslation('freezer');
  const { number, tenths } = useFormat();
  const laneSaid = (lane: SectionLane): string => {
    const stack = { stack: tenths(lane.stackIn), full: tenths(lane.usableStackIn) };
    const words = t(lane.about ? 'section.said.lane-about' : 'section.said.lane', { size: lane.label, count: lane.bags, bags: number(lane.bags), ...stack });
    return lane.low ? `${words} ${t(lane.bags === 0 ? 'section.said.empty' : 'section.said.low')}` : words;
  };
  const probeSaid = ({ distanceIn }: SectionProbe, i: number): string =>
    distanceIn === null
      ? t('section.said.silent', { n: i + 1, all: probes.length })
      : t('section.said.probe', { n: i + 1, all: probes.length, distance: tenths(distanceIn) });
  return [
    t('section.said.open'),
    ...(asOf ? [t('section.said.as-of', { when: asOf })] : []),
    ...lanes.map(laneSaid),
    ...probes.map(probeSaid),
    ...(airText ? [t('section.said.air', { air: airText })] : []),
  ];
}

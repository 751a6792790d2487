import type { Freezer } from '../../../server/contract/freezers';
import { freshnessOf } from '../../../server/domain/freshness';
import { usableStackIn } from '../../../server/domain/level';
import { FrontSection } from '../../freezer/front-section';
import { isLow } from './lane-low';
import { useStoreWords } from './use-store-words';

interface Props {
  freezer: Freezer;
  state: NonNullable<Freezer['state']>;
  zone: string;
  now: number;
}

/** The front section, drawn from the freezer's own readings. */
export function FreezerSection({ freezer, state, zone, now }: Props) {
  const say = useStoreWords(zone, now);
  const { model, mount, sensor } = freezer;
  const probesIn = sensor?.probesIn ?? [];
  const usable = usableStackIn({ model, mount: { ...mount, probesIn } });
  const lanes = state.level.lanes.map((level, i) => {
    const lane = freezer.lanes[i];
    const { bags, about, stackIn } = level;
    const bagPounds = lane?.bagPounds ?? 0;
    return { widthShare: lane?.widthShare ?? 0, label: say.pounds(bagPounds), bags, about, stackIn, usableStackIn: usable, bagPounds, low: isLow(level) };
  });
  return (
    <FrontSection
      widthIn={model.insideWidthIn}
      heightIn={model.insideHeightIn}
      channelDropIn={mount.channelDropIn}
      rackIn={mount.rackIn}
      probes={probesIn.map((xIn, i) => ({ xIn, distanceIn: state.distancesIn[i] ?? null }))}
      lanes={lanes}
      airText={state.airF === null ? '' : say.degrees(state.airF)}
      asOf={freshnessOf(state.at, now) === 'fresh' ? undefined : say.when(state.at)}
    />
  );
}

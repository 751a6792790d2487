import type { Freezer } from '../../../../server/contract/freezers';
import type { StorePage } from '../../../../server/contract/stores';
import { answersFor, truckToCome } from '../../../../server/domain/answers';
import { standingOf } from '../../../../server/domain/freezer-standing';
import { ColdSentence } from '../../stores/cold-sentence';
import { FreezerTag } from '../../stores/freezer-tag';
import { FullSentence } from '../../stores/full-sentence';
import { useKnown } from '../../stores/store-known';

interface Props {
  freezer: Freezer;
  around: StorePage;
  now: number;
}

/** What the readings of one freezer mean now, and what happens next. */
export function FreezerMeaning({ freezer, around, now }: Props) {
  const known = useKnown(around);
  const zone = around.store.timeZone;
  const standing = standingOf(freezer, truckToCome(known), now, zone);
  const { full, cold } = answersFor({ ...known, freezers: [freezer] }, now);
  return (
    <div className="flex flex-wrap items-start justify-between gap-x-4 gap-y-1.5">
      {freezer.sensor && freezer.state && (
        <p className="max-w-prose min-w-0 flex-1 basis-72 text-lead [&_b]:font-bold">
          <FullSentence said={full.said} zone={zone} now={now} /> <ColdSentence said={cold.said} zone={zone} now={now} />
        </p>
      )}
      <FreezerTag freezer={freezer} standing={standing} now={now} />
    </div>
  );
}

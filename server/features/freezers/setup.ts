import type { FreezerSettings } from '../../contract/freezer-settings';
import { inArray, models, products, type ProducerDb } from '../../db';
import { setupFaults } from '../../domain/level';
import type { Lane } from '../../domain/types';
import { problem } from '../../http/problem';

type Setup = Pick<FreezerSettings, 'modelId' | 'mount' | 'lanes'>;

interface Around {
  /** Of the sensor in it; without one, a probe in the middle stands for any. */
  probesIn?: number[];
  /** Lanes it has already, whose products it may keep though they are retired. */
  kept?: FreezerSettings['lanes'];
}

/** Refuses a freezer whose level could never be told. */
export function refuseImpossible(db: ProducerDb, { modelId, mount, lanes }: Setup, { probesIn, kept = [] }: Around = {}): void {
  const model = db.find(models, modelId);
  if (!model) throw problem('place-unknown');
  const setup = { model, mount: { ...mount, probesIn: probesIn ?? [model.insideWidthIn / 2] }, lanes: withPounds(db, lanes, kept) };
  if (setupFaults(setup).length > 0) throw problem('setup-impossible');
}

function withPounds(db: ProducerDb, lanes: Setup['lanes'], kept: Setup['lanes']): Lane[] {
  const { id, bagPounds, retiredAt } = products;
  const wanted = lanes.map(({ productId }) => productId);
  const known = new Map(db.select({ id, bagPounds, retiredAt }).from(products).where(inArray(id, wanted)).all().map((product) => [product.id, product]));
  return lanes.map((lane) => {
    const product = known.get(lane.productId);
    const mayStay = kept.some(({ productId }) => productId === lane.productId);
    if (!product || (product.retiredAt !== null && !mayStay)) throw problem('unknown-product');
    return { ...lane, bagPounds: product.bagPounds };
  });
}

import * as z from 'zod/mini';
import { fault, id, measure, producerParams, version, withProducer, words } from './common';
import { SHARES_TOLERANCE } from '../domain/level';
import { endpoint } from './endpoint';
import { placements } from './words';

const share = z.number(fault('share')).check(z.gt(0, fault('share')), z.maximum(1, fault('share')));
const sumsToOne = (lanes: { widthShare: number }[]) => Math.abs(lanes.reduce((sum, { widthShare }) => sum + widthShare, 0) - 1) <= SHARES_TOLERANCE;

/** What is entered of a freezer. */
const entered = {
  storeId: id,
  modelId: id,
  assetNumber: words(40, 1),
  name: words(120, 1),
  placement: z.enum(placements, fault('choice')),
  condition: words(200),
  mount: z.strictObject({ channelDropIn: measure(0, 40), rackIn: measure(0, 40), headroomIn: measure(0, 40) }),
  /** Left to right; shares of the inside width sum to one. */
  lanes: z
    .array(z.strictObject({ productId: id, widthShare: share }))
    .check(z.minLength(1, fault('lanes')), z.maxLength(8, fault('too-long')), z.refine(sumsToOne, fault('shares'))),
};

const freezerSettings = z.object({ id, ...entered, retired: z.boolean(), version });
export type FreezerSettings = z.output<typeof freezerSettings>;

export const readFreezerSettings = endpoint({
  id: 'freezers.readSettings',
  method: 'get',
  path: '/api/:producer/freezers/:freezerId/settings',
  access: { kind: 'may', action: 'update', subject: 'Freezer' },
  params: withProducer({ freezerId: id }),
  result: freezerSettings,
  problems: ['not-found'],
});

export const createFreezer = endpoint({
  id: 'freezers.create',
  method: 'post',
  path: '/api/:producer/freezers',
  access: { kind: 'may', action: 'create', subject: 'Freezer' },
  params: producerParams,
  body: z.strictObject(entered),
  status: 201,
  result: freezerSettings,
  problems: ['bad-input', 'not-allowed', 'place-unknown', 'unknown-product', 'setup-impossible'],
});

/** Retired frees its sensor. */
export const changeFreezer = endpoint({
  id: 'freezers.change',
  method: 'patch',
  path: '/api/:producer/freezers/:freezerId',
  access: { kind: 'may', action: 'update', subject: 'Freezer' },
  params: withProducer({ freezerId: id }),
  body: z.strictObject({ version, ...z.partial(z.object(entered)).shape, retired: z.optional(z.boolean()) }),
  result: freezerSettings,
  problems: ['bad-input', 'not-found', 'not-allowed', 'place-unknown', 'unknown-product', 'setup-impossible', 'changed-meanwhile'],
});

const probe = measure(0, 200);

/** Hangs a sensor in the freezer from now on; what hung there is taken off. One that hangs elsewhere moves only if `move` is said. */
export const tieSensor = endpoint({
  id: 'freezers.tieSensor',
  method: 'put',
  path: '/api/:producer/freezers/:freezerId/sensor',
  access: { kind: 'may', action: 'create', subject: 'Install' },
  params: withProducer({ freezerId: id }),
  body: z.strictObject({
    sensorId: id,
    /** Inches of each probe from the left inside wall, left to right. */
    probesIn: z
      .array(probe)
      .check(
        z.minLength(1, fault('probes')),
        z.maxLength(8, fault('probes')),
        z.refine((at) => at.every((x, i) => i === 0 || x > (at[i - 1] ?? 0)), fault('probes-order')),
      ),
    move: z._default(z.boolean(), false),
  }),
  answer: 'nothing',
  problems: ['bad-input', 'not-found', 'not-allowed', 'unknown-sensor', 'sensor-elsewhere', 'setup-impossible'],
});

export const takeSensorOff = endpoint({
  id: 'freezers.takeSensorOff',
  method: 'delete',
  path: '/api/:producer/freezers/:freezerId/sensor',
  access: { kind: 'may', action: 'update', subject: 'Install' },
  params: withProducer({ freezerId: id }),
  answer: 'nothing',
  problems: ['not-found', 'not-allowed'],
});

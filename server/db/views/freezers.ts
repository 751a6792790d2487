import { sql, type SQL } from 'drizzle-orm';
import type { Freezer } from '../../contract/freezers';
import type { ProducerDb } from '../producer-db';
import { freezers, freezerStates, installs, lanes, models, products, sensors, stores } from '../schema';

export type FreezerRow = Freezer & { storeId: string; store: string; timeZone: string };

interface Joined {
  body: string;
  lanes: string;
  sensor: string | null;
  state: string | null;
}

/** Freezers as a page draws them: model, mount, lanes, the sensor in it now, and what its readings mean. */
export function freezersView(db: ProducerDb, where: SQL, order: SQL, limit = 500): FreezerRow[] {
  const rows = db.view<Joined>(
    (producer) => sql`
    select
      json_object(
        'id', ${freezers.id}, 'name', ${freezers.name}, 'assetNumber', ${freezers.assetNumber},
        'placement', ${freezers.placement}, 'condition', ${freezers.condition},
        'storeId', ${stores.id}, 'store', ${stores.name}, 'timeZone', ${stores.timeZone},
        'model', json_object(
          'name', ${models.name}, 'insideWidthIn', ${models.insideWidthIn}, 'insideDepthIn', ${models.insideDepthIn},
          'insideHeightIn', ${models.insideHeightIn}, 'doors', ${models.doors}, 'ratedPounds', ${models.ratedPounds},
          'defrost', ${models.defrost}),
        'mount', json_object(
          'channelDropIn', ${freezers.channelDropIn}, 'rackIn', ${freezers.rackIn}, 'headroomIn', ${freezers.headroomIn})
      ) as body,
      (select json_group_array(json_object(
          'productId', p.id, 'product', p.name, 'bagPounds', p.bag_pounds, 'widthShare', l.width_share) order by l.position)
        from ${lanes} l join ${products} p on p.producer_id = ${producer} and p.id = l.product_id
        where l.producer_id = ${producer} and l.freezer_id = ${freezers.id}) as lanes,
      (select json_object('id', s.id, 'serial', s.serial, 'since', i."from", 'probesIn', json(i.probes_in))
        from ${installs} i join ${sensors} s on s.producer_id = ${producer} and s.id = i.sensor_id
        where i.producer_id = ${producer} and i.freezer_id = ${freezers.id} and i."to" is null
        order by i."from" desc limit 1) as sensor,
      (select st.state from ${freezerStates} st where st.producer_id = ${producer} and st.id = ${freezers.id}) as state
    from ${freezers}
    join ${stores} on ${stores.producerId} = ${producer} and ${stores.id} = ${freezers.storeId}
    join ${models} on ${models.producerId} = ${producer} and ${models.id} = ${freezers.modelId}
    where ${freezers.producerId} = ${producer} and ${freezers.retiredAt} is null and ${where}
    order by ${order} limit ${limit}`,
  );
  return rows.map(assemble);
}

/** Built by the statement above in the contract's shape. */
const assemble = ({ body, lanes: laneList, sensor, state }: Joined): FreezerRow => ({
  ...JSON.parse(body),
  lanes: JSON.parse(laneList),
  sensor: sensor === null ? null : JSON.parse(sensor),
  state: state === null ? null : JSON.parse(state),
});

export const freezersOfStore = (db: ProducerDb, storeId: string): FreezerRow[] =>
  freezersView(db, sql`${freezers.storeId} = ${storeId}`, sql`${freezers.position}, ${freezers.id}`);

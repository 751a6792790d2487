import { beforeEach, describe, expect, test } from 'vitest';
import { sensors } from '../../server/db';
import { alderPeople, birch } from '../cast';
import { hour, idOf, morning } from '../factories';
import { browserOf } from '../support/server';
import { at, freezerDesk, front, id, problemOf } from './freezer-desk';

const { bed, change, hung, trailOf, listed } = freezerDesk();
const theirs = (thing: string) => idOf(birch.namespace, thing);
const tie = (freezer: string, body: object, who = bed.ada) => who.put(`${at}/freezers/${freezer}/sensor`).send({ probesIn: [12, 35, 58], ...body });
const takeOff = (freezer: string, who = bed.ada) => who.delete(`${at}/freezers/${freezer}/sensor`);

describe('tying a sensor', () => {
  const spare = id('spare sensor');
  beforeEach(() => bed.db.insert(sensors, { id: spare, no: 900, serial: 'urn:dev:ow:spare', createdAt: morning - hour }));

  test('hangs it from now on and takes off what hung there', async () => {
    bed.server.clock.now += hour;
    await tie(front, { sensorId: spare, probesIn: [10, 60] }).expect(204);
    const [old, now] = hung(front);
    expect(old).toMatchObject({ sensorId: id('lantern sensor'), to: morning + hour });
    expect(now).toEqual({ sensorId: spare, probesIn: [10, 60], from: morning + hour, to: null });
    expect((await listed('lantern'))[0]).toMatchObject({ serial: 'urn:dev:ow:spare', pounds: null });
    expect(trailOf(front)[0]).toEqual({ act: 'tie-sensor', changes: { sensorId: spare, probesIn: [10, 60] } });
  });

  test('one that hangs elsewhere moves only if that is said; the freezer it left knows', async () => {
    const juniper = id('juniper freezer');
    expect((await tie(front, { sensorId: id('juniper sensor') }).expect(409)).body).toMatchObject(problemOf('sensor-elsewhere'));
    expect(hung(front)).toMatchObject([{ to: null }]);
    bed.server.clock.now += hour;
    await tie(front, { sensorId: id('juniper sensor'), move: true }).expect(204);
    expect(hung(juniper)).toMatchObject([{ sensorId: id('juniper sensor'), to: morning + hour }]);
    expect(hung(front)).toMatchObject([{ to: morning + hour }, { sensorId: id('juniper sensor'), to: null }]);
    expect((await listed('juniper'))[0]).toMatchObject({ serial: null, pounds: null });
    expect(trailOf(juniper)[0]).toEqual({ act: 'tie-sensor', changes: { sensorId: null } });
  });

  test('out of a freezer they may not see a technician takes none', async () => {
    const tried = await tie(front, { sensorId: id('juniper sensor'), move: true }, browserOf(bed.server, alderPeople.technician)).expect(409);
    expect(tried.body).toMatchObject(problemOf('sensor-elsewhere'));
    expect(hung(id('juniper freezer'))).toMatchObject([{ to: null }]);
  });

  test('again with other probes begins anew; with the same ones nothing begins', async () => {
    bed.server.clock.now += hour;
    const own = { sensorId: id('lantern sensor') };
    await tie(front, own).expect(204);
    expect(hung(front)).toHaveLength(1);
    await tie(front, { ...own, probesIn: [11, 35, 58] }).expect(204);
    expect(hung(front)).toMatchObject([
      { probesIn: [12, 35, 58], to: morning + hour },
      { probesIn: [11, 35, 58], from: morning + hour, to: null },
    ]);
  });

  test.each([
    ['unknown-sensor', 422, { sensorId: theirs('lantern sensor') }],
    ['unknown-sensor', 422, { sensorId: idOf('nowhere', 'sensor') }],
    ['setup-impossible', 422, { sensorId: spare, probesIn: [12, 71] }],
    ['bad-input', 400, { sensorId: spare, probesIn: [] }],
    ['bad-input', 400, { sensorId: spare, probesIn: [35, 12] }],
    ['bad-input', 400, { sensorId: 'spare' }],
  ])('%s changes nothing', async (type, status, body) => {
    expect((await tie(front, body).expect(status)).body).toMatchObject(problemOf(type));
    expect(hung(front)).toMatchObject([{ sensorId: id('lantern sensor'), to: null }]);
  });

  test('a freezer that is retired or another producer’s is not there', async () => {
    await change(front, { version: 1, retired: true }).expect(200);
    for (const freezer of [front, theirs('lantern freezer')]) {
      await tie(freezer, { sensorId: spare }).expect(404);
      await takeOff(freezer).expect(404);
    }
  });

  test('technicians do so in freezers of stores they may read, and others not at all', async () => {
    const theo = browserOf(bed.server, alderPeople.technician);
    await tie(front, { sensorId: spare }, theo).expect(204);
    await tie(id('juniper freezer'), { sensorId: spare }, theo).expect(404);
    await takeOff(id('juniper freezer'), theo).expect(404);
    await takeOff(front, theo).expect(204);
    for (const person of [alderPeople.agent, alderPeople.dispatcher, alderPeople.manager]) {
      await tie(front, { sensorId: spare }, browserOf(bed.server, person)).expect(403);
      await takeOff(front, browserOf(bed.server, person)).expect(403);
    }
  });
});

describe('taking a sensor off', () => {
  test('ends what hangs there, once', async () => {
    bed.server.clock.now += hour;
    await takeOff(front).expect(204);
    expect(hung(front)).toMatchObject([{ sensorId: id('lantern sensor'), to: morning + hour }]);
    expect((await listed('lantern'))[0]).toMatchObject({ serial: null, pounds: null });
    expect(trailOf(front)[0]).toEqual({ act: 'take-sensor-off', changes: { sensorId: null } });
    expect((await takeOff(front).expect(404)).body).toMatchObject(problemOf('not-found'));
  });
});

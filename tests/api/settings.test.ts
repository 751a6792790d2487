import { afterAll, beforeAll, beforeEach, expect, test } from 'vitest';
import sharp from 'sharp';
import { alder, alderPeople } from '../cast';
import { idOf, morning, day } from '../factories';
import { browserOf, testApp, waitingMail, type Agent, type TestApp } from '../support/server';

const at = `/api/${alder.slug}`;
let bed: TestApp;
let admin: Agent;
beforeAll(async () => {
  bed = await testApp();
});
afterAll(() => bed.close());
beforeEach(() => {
  admin = browserOf(bed, alderPeople.admin);
});

const serviceHours = [{ days: [1, 2, 3, 4, 5], from: '07:00', to: '17:00' }];

test('what is changed is what is read, by whoever works with the producer', async () => {
  await bed.undone(async () => {
    const holidays = [{ day: '2026-11-26', name: 'Thanksgiving' }, { day: '2026-12-25', name: 'Christmas' }];
    const change = { version: 1, name: 'Alder & Sons Ice', urgentPhone: '555-0177', serviceHours, holidays, mailSender: { name: 'Alder Ice', replyTo: 'desk@alder.example' } };
    const { body } = await admin.patch(`${at}/settings`).send(change).expect(200);
    expect(body).toMatchObject({ ...change, version: 2 });
    const me = await browserOf(bed, alderPeople.manager).get('/api/me').expect(200);
    // The one that is over is nobody's news.
    expect(me.body.memberships[0].producer).toMatchObject({ name: 'Alder & Sons Ice', urgentPhone: '555-0177', serviceHours, holidays: [holidays[1]] });
  });
});

test('who saw an older version is told, and changes nothing', async () => {
  await bed.undone(async () => {
    await admin.patch(`${at}/settings`).send({ version: 1, urgentPhone: '555-0177' }).expect(200);
    const late = await admin.patch(`${at}/settings`).send({ version: 1, urgentPhone: '555-0188' }).expect(409);
    expect(late.body.type).toContain('changed-meanwhile');
    expect((await admin.get(`${at}/settings`)).body.urgentPhone).toBe('555-0177');
  });
});

test('what is said again as it was is no change', async () => {
  await bed.undone(async () => {
    const { hasLogo: _hasLogo, ...whole } = (await admin.get(`${at}/settings`).expect(200)).body;
    await admin.patch(`${at}/settings`).send({ ...whole, urgentPhone: '555-0177' }).expect(200);
    const { body } = await admin.get(`${at}/audit?subject=Settings`).expect(200);
    expect(body.entries[0].act).toBe('change-settings');
    expect(JSON.parse(body.entries[0].changes)).toEqual({ urgentPhone: '555-0177' });
  });
});

test.each([
  ['/timeZone', { timeZone: 'Mars/Olympus' }, 'time-zone'],
  ['/riskLimit', { riskLimit: 0.9 }, 'risk-limit'],
  ['/name', { name: '  ' }, 'required'],
  ['/serviceHours/0/to', { serviceHours: [{ days: [1], from: '17:00', to: '07:00' }] }, 'span-backwards'],
  ['/serviceHours/0/days', { serviceHours: [{ days: [], from: '07:00', to: '08:00' }] }, 'weekdays'],
  ['/holidays/0/day', { holidays: [{ day: 'tomorrow', name: '' }] }, 'day'],
])('%s is refused at its field', async (pointer, change, fault) => {
  const { body } = await admin.patch(`${at}/settings`).send({ version: 1, ...change }).expect(400);
  expect(body.errors).toContainEqual(expect.objectContaining({ pointer, fault }));
});

test('a lower risk limit puts fewer hours between a freezer and its risk', async () => {
  await bed.undone(async () => {
    const riskOf = async () => (await admin.get(`${at}/freezers?store=${idOf(alder.namespace, 'lantern')}`).expect(200)).body.freezers[0].riskAt;
    // Early (10 %) in two days, likely (50 %) in three: 30 % lies half-way between.
    expect(await riskOf()).toBe(morning + 2 * day);
    await admin.patch(`${at}/settings`).send({ version: 1, riskLimit: 0.3 }).expect(200);
    expect(await riskOf()).toBe(morning + 2.5 * day);
  });
});

test('mail says who it is from, and where answers go', async () => {
  await bed.undone(async () => {
    await admin.patch(`${at}/settings`).send({ version: 1, mailSender: { name: 'Alder Ice', replyTo: 'desk@alder.example' } }).expect(200);
    await admin.post(`${at}/people/${idOf(alder.namespace, 'manager')}/invitations`).expect(202);
    expect(waitingMail(bed).at(-1)).toMatchObject({ sender: { name: 'Alder Ice', replyTo: 'desk@alder.example' } });
  });
});

test('the picture is drawn anew, shown to its own people, and can be taken away', async () => {
  const picture = await sharp({ create: { width: 900, height: 300, channels: 3, background: '#0b5563' } }).withMetadata({ exif: { IFD0: { Copyright: 'somebody' } } }).jpeg().toBuffer();
  await bed.undone(async () => {
    await admin.put(`${at}/logo`).attach('logo', picture, 'logo.jpg').expect(204);
    const { body, headers } = await browserOf(bed, alderPeople.manager).get(`${at}/logo`).expect(200);
    expect(headers['content-type']).toBe('image/png');
    const { width, height, exif } = await sharp(body).metadata();
    expect([width, height, exif]).toEqual([512, 171, undefined]);
    await admin.delete(`${at}/logo`).expect(204);
    await admin.get(`${at}/logo`).expect(404);
  });
});

test('what is no picture, or too large, is refused in words', async () => {
  expect((await admin.put(`${at}/logo`).attach('logo', Buffer.from('<svg/>'), 'x.png').expect(422)).body.type).toContain('photo-unreadable');
  expect((await admin.put(`${at}/logo`).attach('logo', Buffer.alloc(2_100_000), 'x.png').expect(413)).body.type).toContain('photo-too-large');
  expect((await admin.put(`${at}/logo`).attach('other', picture1, 'x.png')).status).toBe(422);
});

const picture1 = Buffer.from('no picture');

import sharp from 'sharp';
import { afterAll, beforeAll, describe, expect, test } from 'vitest';
import { alderPeople } from '../cast';
import { idOf } from '../factories';
import { browserOf, testApp, type Agent, type TestApp } from '../support/server';
import { badPictures, camera, goodPictures, type Given } from './pictures';

let server: TestApp;
let marta: Agent;
let good: Given[];
let bad: Given[];
beforeAll(async () => {
  server = await testApp('alder');
  marta = browserOf(server, alderPeople.manager);
  [good, bad] = [await goodPictures(), await badPictures()];
});
afterAll(() => server.close());

const root = '/api/alder-ice/requests';
const typeOf = (body: { type?: string }): string | undefined => body.type?.replace('urn:nilas:problem:', '');

async function fileOne(): Promise<string> {
  return (await marta.post(root).send({ storeId: idOf('alder', 'lantern'), kind: 'leak' }).expect(201)).body.id;
}

const send = (who: Agent, request: string, files: Given[], field = 'photos') =>
  files.reduce((post, { name, type, bytes }) => post.attach(field, bytes, { filename: name, contentType: type }), who.post(`${root}/${request}/photos`));

const bytesOf = async (path: string): Promise<{ bytes: Buffer; headers: Record<string, string> }> => {
  const answer = await marta.get(path).buffer(true).parse((res, done) => {
    const parts: Buffer[] = [];
    res.on('data', (part: Buffer) => parts.push(part));
    res.on('end', () => done(null, Buffer.concat(parts)));
  }).expect(200);
  return { bytes: answer.body, headers: answer.headers };
};

describe('pictures', () => {
  test('the corpus is as large as it should be', () => {
    expect(good.length + bad.length).toBeGreaterThanOrEqual(30);
    expect(good.find(({ name }) => name === 'place.jpg')?.bytes.includes(camera)).toBe(true);
  });

  test('good ones are drawn anew: a JPEG without place, camera, comment or anything behind it', async () => {
    for (const one of good) {
      const request = await fileOne();
      const { body } = await send(marta, request, [one]);
      expect(body.photoList, one.name).toHaveLength(1);
      const { bytes, headers } = await bytesOf(`${root}/${request}/photos/${body.photoList[0].id}`);
      const { format, exif, icc, xmp, width = 0, height = 0, orientation } = await sharp(bytes).metadata();
      expect({ format, exif, icc, xmp, orientation }, one.name).toEqual({ format: 'jpeg', exif: undefined, icc: undefined, xmp: undefined, orientation: undefined });
      expect([width, height], one.name).toEqual([body.photoList[0].width, body.photoList[0].height]);
      expect(Math.max(width, height), one.name).toBeLessThanOrEqual(2000);
      for (const trace of [camera, 'GPS', '<script', '<?php', 'PK\u0003\u0004']) expect(bytes.includes(trace), `${one.name} ${trace}`).toBe(false);
      expect(headers['content-type']).toBe('image/jpeg');
      expect(headers['x-content-type-options']).toBe('nosniff');
      if (one.name === 'turned.jpg') expect([width, height]).toEqual([30, 40]);
    }
  });

  test('bad ones are refused with words, and nothing is kept', async () => {
    const request = await fileOne();
    for (const one of bad) {
      const answer = await send(marta, request, [one]);
      expect([answer.status, typeOf(answer.body)], one.name).toEqual([422, 'photo-unreadable']);
    }
    const together = good[0];
    const spoiled = bad[1];
    if (!together || !spoiled) throw new Error('the corpus is empty');
    await send(marta, request, [together, spoiled]).expect(422);
    expect((await marta.get(`${root}/${request}`)).body.photoList).toEqual([]);
  });
});

describe('limits', () => {
  const [small] = [{ name: 'a.png', type: 'image/png', bytes: Buffer.from('iVBORw0KGgoAAAANSUhEUgAAAAEAAAABCAYAAAAfFcSJAAAADUlEQVR42mP8/5+hHgAHggJ/PchI7wAAAABJRU5ErkJggg==', 'base64') }];

  test('ten megabytes a picture', async () => {
    const huge = { ...small, bytes: Buffer.concat([small.bytes, Buffer.alloc(10 * 1024 * 1024)]) };
    expect(typeOf((await send(marta, await fileOne(), [huge]).expect(413)).body)).toBe('photo-too-large');
  });

  test('five pictures a request, at once or one after the other', async () => {
    const request = await fileOne();
    expect(typeOf((await send(marta, request, Array<Given>(6).fill(small)).expect(422)).body)).toBe('too-many-photos');
    await send(marta, request, Array<Given>(4).fill(small)).expect(201);
    expect(typeOf((await send(marta, request, [small, small]).expect(422)).body)).toBe('too-many-photos');
    await send(marta, request, [small]).expect(201);
    await send(marta, request, [small]).expect(422);
  });

  test('of three senders at once no more than five get in', async () => {
    const request = await fileOne();
    await Promise.all([1, 2, 3].map(() => send(marta, request, [small, small])));
    expect((await marta.get(`${root}/${request}`)).body.photoList.length).toBeLessThanOrEqual(5);
  });

  test('other fields, no file, no form: refused, never a failure', async () => {
    const request = await fileOne();
    expect((await send(marta, request, [small], 'files')).status).toBe(422);
    expect((await marta.post(`${root}/${request}/photos`).send({ photos: 'x' })).status).toBe(422);
    const raw = (type: string, body: string) => marta.post(`${root}/${request}/photos`).set('content-type', type).send(body);
    for (const [type, body] of [
      ['multipart/form-data', 'x'],
      ['multipart/form-data; boundary=x', '--x\r\nnonsense'],
      ['multipart/form-data; boundary=x', '--x\r\ncontent-disposition: form-data; name="photos"; filename="a"\r\n\r\ncut'],
    ] as const) {
      const answer = await raw(type, body);
      expect(answer.status, body).toBeGreaterThanOrEqual(400);
      expect(answer.status, body).toBeLessThan(500);
    }
  });

  test('a request that ended takes none', async () => {
    const request = await fileOne();
    await marta.delete(`${root}/${request}`).expect(200);
    expect(typeOf((await send(marta, request, [small]).expect(409)).body)).toBe('request-ended');
  });

  test('nobody signed in: refused before the file is looked at', async () => {
    const request = await fileOne();
    const answer = await fetch(`${server.url}${root}/${request}/photos`, { method: 'POST', body: Buffer.alloc(100), headers: { 'content-type': 'multipart/form-data; boundary=x', 'sec-fetch-site': 'same-origin' } });
    expect(answer.status).toBe(401);
  });
});

import { createServer } from 'node:net';
import { simpleParser, type ParsedMail } from 'mailparser';
import { SMTPServer } from 'smtp-server';
import { afterEach, beforeEach, describe, expect, test } from 'vitest';
import { localMail } from '../../server/adapters/mail/local';
import { smtpMail } from '../../server/adapters/mail/real';
import { asc, localMails, outbox } from '../../server/db';
import { sendDue } from '../../server/jobs/outbox';
import type { Mail, MailPort } from '../../server/ports/mail';
import { morning } from '../factories';
import { testApp, type TestApp } from '../support/server';

interface Received {
  /** Who got it. */
  to: string[];
  subject: string;
  text: string;
  html: string;
}

/** A port under test with a look into what arrived. */
interface Bench {
  mail: MailPort;
  received: () => Promise<Received[]>;
  close: () => Promise<void>;
}

const from = 'Nilas <ice@nilas.example>';
const letter: Mail = { to: 'marta@lantern.example', subject: 'SR-1006: el camión llega el jueves', text: 'Señora Marta,\n\nllega.', html: '<p>Señora Marta, llega.</p>' };

let server: TestApp;
beforeEach(async () => {
  server = await testApp('nobody');
});
afterEach(() => server.close());

const local = async (): Promise<Bench> => ({
  mail: localMail(server.db, from, server.services.now),
  received: async () =>
    server.db.select().from(localMails).orderBy(asc(localMails.at), asc(localMails.id)).all().map(({ to, ...rest }) => ({ ...rest, to: [to] })),
  close: async () => {},
});

/** A mail server on this machine that takes every letter, or refuses the address it is told to. */
async function postOffice(refused = 'refused@nowhere.example') {
  const letters: { envelope: string[]; parsed: ParsedMail }[] = [];
  const office = new SMTPServer({
    authOptional: true,
    disabledCommands: ['STARTTLS', 'AUTH'],
    onRcptTo: ({ address }, _session, done) => done(address === refused ? new Error('550 nobody here') : null),
    onData: (stream, session, done) => {
      simpleParser(stream).then((mail) => {
        letters.push({ envelope: session.envelope.rcptTo.map(({ address }) => address), parsed: mail });
        done();
      }, done);
    },
  });
  const port = await freePort();
  await new Promise<void>((resolve) => office.listen(port, '127.0.0.1', resolve));
  return { letters, url: `smtp://127.0.0.1:${port}`, close: () => new Promise<void>((resolve) => office.close(() => resolve())) };
}

const real = async (): Promise<Bench> => {
  const office = await postOffice();
  return {
    mail: smtpMail(office.url, from),
    received: async () =>
      office.letters.map(({ envelope, parsed }) => ({
        to: envelope,
        subject: parsed.subject ?? '',
        text: (parsed.text ?? '').trim(),
        html: String(parsed.html || '').trim(),
      })),
    close: office.close,
  };
};

describe.each([
  ['local', local],
  ['real', real],
])('the %s adapter', (_which, open) => {
  let bench: Bench;
  beforeEach(async () => {
    bench = await open();
  });
  afterEach(() => bench.close());

  test('carries a letter whole, accents and all', async () => {
    await bench.mail.send(letter, 'letter-1');
    expect(await bench.received()).toEqual([expect.objectContaining({ to: [letter.to], subject: letter.subject, text: letter.text, html: letter.html })]);
  });

  test('writes to one address, whatever the address looks like', async () => {
    await bench.mail.send({ ...letter, to: 'a@b.example, c@d.example' }, 'letter-1').catch(() => undefined);
    await bench.mail.send({ ...letter, to: 'a@b.example\r\nbcc: c@d.example' }, 'letter-2').catch(() => undefined);
    for (const { to } of await bench.received()) {
      expect(to).toHaveLength(1);
      expect(to).not.toContain('c@d.example');
    }
  });

  test('a line break in the subject starts no header', async () => {
    await bench.mail.send({ ...letter, subject: 'one\r\nbcc: c@d.example' }, 'letter-1');
    const [received] = await bench.received();
    expect(received?.to).toEqual([letter.to]);
  });
});

describe('what only one of them can show', () => {
  test('the local one keeps a letter sent twice once', async () => {
    const bench = await local();
    await bench.mail.send(letter, 'letter-1');
    await bench.mail.send(letter, 'letter-1');
    await bench.mail.send(letter, 'letter-2');
    expect(await bench.received()).toHaveLength(2);
  });

  test('the real one names a letter by its key, so that a mailbox can know it again', async () => {
    const office = await postOffice();
    const mail = smtpMail(office.url, from);
    await mail.send(letter, 'letter-1');
    await mail.send(letter, 'letter-1');
    expect(office.letters.map(({ parsed }) => parsed.messageId)).toEqual(['<letter-1@nilas.example>', '<letter-1@nilas.example>']);
    expect(office.letters[0]?.parsed.from?.value).toEqual([{ name: 'Nilas', address: 'ice@nilas.example' }]);
    await office.close();
  });

  test('the real one rejects what was not taken over', async () => {
    const office = await postOffice();
    await expect(smtpMail(office.url, from).send({ ...letter, to: 'refused@nowhere.example' }, 'k')).rejects.toThrow();
    await office.close();
    await expect(smtpMail(office.url, from).send(letter, 'k')).rejects.toThrow();
  });
});

describe('the outbox', () => {
  const put = (id: string): void => {
    server.db.insert(outbox).values({ id, kind: 'mail', payload: JSON.stringify({ ...letter, subject: id }), dueAt: server.clock.now, createdAt: server.clock.now }).run();
  };
  const send = (mail: MailPort) => sendDue({ db: server.db, mail, log: server.services.log, now: server.services.now });

  test('waits while the mail server is away, longer each time, and then sends all of it once', async () => {
    for (let i = 0; i < 20; i += 1) put(`letter-${String(i).padStart(2, '0')}`);
    const away = smtpMail(`smtp://127.0.0.1:${await freePort()}`, from);
    expect(await send(away)).toBe(0);
    expect(await send(away)).toBe(0);
    expect(server.db.select().from(outbox).all().every(({ attempts, doneAt }) => attempts === 1 && doneAt === null)).toBe(true);
    const office = await postOffice();
    server.clock.now = morning + 3_600_000;
    expect(await send(smtpMail(office.url, from))).toBe(20);
    expect(await send(smtpMail(office.url, from))).toBe(0);
    expect(office.letters.map(({ parsed }) => parsed.subject)).toEqual(Array.from({ length: 20 }, (_, i) => `letter-${String(i).padStart(2, '0')}`));
    expect(server.db.select().from(outbox).all().every(({ payload }) => payload === '')).toBe(true);
    await office.close();
  });

  test('one letter that is refused holds up no other, and is given up in the end', async () => {
    put('good');
    server.db.insert(outbox).values({ id: 'bad', kind: 'mail', payload: 'not a letter', dueAt: server.clock.now, createdAt: server.clock.now }).run();
    const { mail, received } = await local();
    expect(await send(mail)).toBe(1);
    expect(await received()).toHaveLength(1);
    for (let i = 0; i < 20; i += 1) {
      server.clock.now += 3_600_000;
      await send(mail);
    }
    const bad = server.db.select().from(outbox).all().find(({ id }) => id === 'bad');
    expect([bad?.attempts, bad?.doneAt === null, bad?.lastError === null]).toEqual([12, false, false]);
  });

  test('a process that dies in mid-send tries that letter again later', async () => {
    put('letter');
    const never: MailPort = { send: () => new Promise(() => {}) };
    void send(never);
    const { mail, received } = await local();
    expect(await send(mail)).toBe(0);
    server.clock.now += 3_600_000;
    expect(await send(mail)).toBe(1);
    expect(await received()).toHaveLength(1);
  });
});

function freePort(): Promise<number> {
  return new Promise((resolve) => {
    const probe = createServer().listen(0, '127.0.0.1', () => {
      const address = probe.address();
      probe.close(() => resolve(typeof address === 'object' && address ? address.port : 0));
    });
  });
}

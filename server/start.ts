import { randomBytes } from 'node:crypto';
import path from 'node:path';
import { pino } from 'pino';
import { v7 as uuidv7 } from 'uuid';
import { localMail } from './adapters/mail/local';
import { smtpMail } from './adapters/mail/real';
import { localStorage } from './adapters/storage/local';
import { buildApp } from './app';
import type { Config } from './config';
import { fillFleetRows, migrateDatabase, openDatabase, producerDb, systemDb } from './db';
import type { Services } from './http/context';
import { expireSessions } from './http/session';
import { every } from './jobs/every';
import { sendDue } from './jobs/outbox';
import type { MailPort } from './ports/mail';
import { openPipeline } from './telemetry/pipeline';

export interface Running {
  services: Services;
  port: number;
  stop: () => Promise<void>;
}

const MINUTE = 60_000;

/** Opens the data, migrates, builds, listens, and starts the jobs; `stop` undoes it in order. */
export async function start(config: Config, root: string, now = () => Date.now()): Promise<Running> {
  const services = openServices(config, root, now);
  const { db, log, system, pipeline } = services;
  const mail = mailOf(services);
  const app = buildApp(services, path.join(root, 'dist/client'));
  const server = app.listen(config.port, config.host);
  await new Promise<void>((resolve, reject) => server.once('listening', resolve).once('error', reject));
  const jobs = [
    every(500, log, async () => void (await sendDue({ db, mail, log, now }))),
    every(10 * MINUTE, log, async () => {
      expireSessions(db, now());
      system.expireLinks(now() - 60 * MINUTE);
    }),
  ];
  const address = server.address();
  return {
    services,
    port: typeof address === 'object' && address ? address.port : config.port,
    async stop() {
      await new Promise<void>((resolve) => {
        server.close(() => resolve());
        server.closeIdleConnections();
        setTimeout(() => server.closeAllConnections(), 3000).unref();
      });
      await Promise.all(jobs.map((job) => job.stop()));
      await pipeline.stop();
      db.$client.close();
    },
  };
}

/** Without SMTP in production nothing is sent: mail waits in the outbox, and the log says so. */
function mailOf({ config, db, log, now }: Services): MailPort {
  if (config.smtpUrl) return smtpMail(config.smtpUrl, config.mailFrom);
  if (config.mode !== 'production') return localMail(db, config.mailFrom, now);
  log.warn('SMTP_URL is not set: nobody can sign in until it is');
  return { send: () => Promise.reject(new Error('SMTP_URL is not set')) };
}

/** Everything but the network, for commands that need the data alone too. */
export function openServices(config: Config, root: string, now = () => Date.now()): Services {
  const log = pino({ level: config.logLevel, redact: ['req.headers.cookie', 'req.headers.authorization'] });
  const db = openDatabase(path.join(config.dataDir, 'nilas.db'));
  migrateDatabase(db, path.join(root, 'drizzle'));
  const system = systemDb(db);
  db.$client.transaction(() => system.producerIds().forEach((id) => fillFleetRows(producerDb(db, id))))();
  const newId = () => uuidv7();
  const newSecret = () => randomBytes(32).toString('base64url');
  const pipeline = openPipeline(db, { now, newId, nextSensorNo: system.nextSensorNo });
  const storage = localStorage(path.join(config.dataDir, 'photos'));
  return { config, db, system, storage, pipeline, log, now, newId, newSecret, patience: 1 };
}

/** Stops once on the first signal and leaves at once on the second. */
export function stopOnSignal(running: Running): void {
  let stopping = false;
  const leave = () => {
    if (stopping) process.exit(1);
    stopping = true;
    running.stop().then(
      () => process.exit(0),
      () => process.exit(1),
    );
  };
  process.on('SIGINT', leave);
  process.on('SIGTERM', leave);
}

import { randomBytes } from 'node:crypto';
import { existsSync, mkdirSync, readFileSync, writeFileSync } from 'node:fs';
import path from 'node:path';
import * as z from 'zod';

export type Mode = 'production' | 'demo' | 'development' | 'test';

const environment = z.object({
  PORT: z.coerce.number().int().min(0).max(65535).default(4040),
  HOST: z.string().default('127.0.0.1'),
  DATA_DIR: z.string().default('data'),
  /** Where people reach the portal; links in mail are built on it and on nothing a request says. */
  BASE_URL: z.url().optional(),
  SESSION_SECRET: z.string().optional(),
  SMTP_URL: z.string().optional(),
  MAIL_FROM: z.string().default('Nilas <ice@nilas.example>'),
  /** How many proxies in front may be believed about the caller's address. */
  TRUST_PROXY: z.coerce.number().int().min(0).default(0),
  LOG_LEVEL: z.enum(['silent', 'error', 'warn', 'info', 'debug']).default('info'),
});

export interface Config {
  mode: Mode;
  port: number;
  host: string;
  dataDir: string;
  baseUrl: string;
  secret: string;
  smtpUrl?: string;
  mailFrom: string;
  trustProxy: number;
  logLevel: string;
}

/** Reads the environment once; throws words for the operator when it cannot be used. */
export function readConfig(mode: Mode, env: NodeJS.ProcessEnv): Config {
  const parsed = environment.safeParse(env);
  if (!parsed.success) throw new Error(`The environment cannot be used:\n${z.prettifyError(parsed.error)}`);
  const { PORT, HOST, DATA_DIR, BASE_URL, SESSION_SECRET, SMTP_URL, MAIL_FROM, TRUST_PROXY, LOG_LEVEL } = parsed.data;
  const dataDir = path.resolve(DATA_DIR);
  mkdirSync(dataDir, { recursive: true, mode: 0o700 });
  return {
    mode,
    port: PORT,
    host: HOST,
    dataDir,
    baseUrl: (BASE_URL ?? `http://localhost:${PORT}`).replace(/\/+$/, ''),
    secret: mode === 'production' ? strong(SESSION_SECRET) : (SESSION_SECRET ?? keptSecret(dataDir)),
    smtpUrl: SMTP_URL,
    mailFrom: MAIL_FROM,
    trustProxy: TRUST_PROXY,
    logLevel: LOG_LEVEL,
  };
}

/** For the commands: an environment that cannot be used ends them with words, not with a stack. */
export function configOrLeave(mode: Mode): Config {
  try {
    return readConfig(mode, process.env);
  } catch (error) {
    console.error(error instanceof Error ? error.message : error);
    process.exit(1);
  }
}

function strong(secret: string | undefined): string {
  const enough = secret !== undefined && secret.length >= 32 && new Set(secret).size >= 12;
  if (!enough) throw new Error('Set SESSION_SECRET to at least 32 random characters, for example from: openssl rand -base64 48');
  return secret;
}

function keptSecret(dataDir: string): string {
  const file = path.join(dataDir, 'secret');
  if (!existsSync(file)) writeFileSync(file, randomBytes(48).toString('base64url'), { mode: 0o600 });
  return readFileSync(file, 'utf8');
}

import { spawn, spawnSync, type ChildProcess } from 'node:child_process';
import { createServer } from 'node:net';
import path from 'node:path';

const root = path.resolve(import.meta.dirname, '../..');

export interface ServerProcess {
  url: string;
  child: ChildProcess;
  /** Resolves when the process is gone. */
  end: (signal: NodeJS.Signals) => Promise<void>;
}

export const productionEnv = (dataDir: string, port: number): NodeJS.ProcessEnv => ({
  ...process.env,
  NODE_ENV: 'production',
  DATA_DIR: dataDir,
  PORT: String(port),
  BASE_URL: `http://127.0.0.1:${port}`,
  SMTP_URL: 'smtp://127.0.0.1:9',
  SESSION_SECRET: 'tHis-is-0nly-a-Secret-of-the-tests-4711-xyz',
  LOG_LEVEL: 'warn',
});

export function freePort(): Promise<number> {
  return new Promise((resolve, reject) => {
    const probe = createServer().once('error', reject);
    probe.listen(0, '127.0.0.1', () => {
      const address = probe.address();
      probe.close(() => (typeof address === 'object' && address ? resolve(address.port) : reject(new Error('no port'))));
    });
  });
}

/** Starts a built command of the server as its own process, under `before` (strace, say) where given. */
export async function startServer(entry: 'main' | 'demo', env: NodeJS.ProcessEnv, options: { before?: string[]; args?: string[]; patienceMs?: number } = {}): Promise<ServerProcess> {
  const { before = [], args = [], patienceMs = 30_000 } = options;
  const [program = '', ...rest] = [...before, process.execPath, path.join(root, `dist/server/${entry}.js`), ...args];
  const child = spawn(program, rest, { env, cwd: root, stdio: ['ignore', 'pipe', 'pipe'], detached: true });
  let said = '';
  for (const stream of [child.stdout, child.stderr]) stream.on('data', (chunk: Buffer) => (said += chunk.toString()));
  const gone = new Promise<void>((resolve) => child.once('exit', () => resolve()));
  const url = `http://127.0.0.1:${env.PORT}`;
  const until = Date.now() + patienceMs;
  while (!(await answers(url))) {
    if (child.exitCode !== null || Date.now() > until) throw new Error(`the server did not come up:\n${said}`);
    await new Promise((resolve) => setTimeout(resolve, 40));
  }
  return {
    url,
    child,
    end: async (signal) => {
      // The whole group, since strace passes nothing on.
      if (child.pid) process.kill(-child.pid, signal);
      await gone;
    },
  };
}

async function answers(url: string): Promise<boolean> {
  try {
    return (await fetch(`${url}/healthz`)).ok;
  } catch {
    return false;
  }
}

/** Creates a producer as an operator would and answers its telemetry key. */
export function createProducer(env: NodeJS.ProcessEnv, slug: string): string {
  const made = spawnSync(
    process.execPath,
    [path.join(root, 'dist/server/producer-create.js'), '--name', slug, '--slug', slug, '--admin-name', 'Operator', '--admin-email', `admin@${slug}.example`],
    { env, cwd: root, encoding: 'utf8' },
  );
  const key = /only here: (\S+)/.exec(made.stdout)?.[1];
  if (!key) throw new Error(`no producer: ${made.stdout}${made.stderr}`);
  return key;
}

// `npm run dev`: the server under tsx (restarted on change) behind Vite, which proxies to it.
import { spawn } from 'node:child_process';

const port = process.env.PORT ?? '4040';
const env = { ...process.env, PORT: port, BASE_URL: process.env.BASE_URL ?? 'http://localhost:5173' };
const children = [
  spawn('node_modules/.bin/tsx', ['watch', '--clear-screen=false', 'server/dev.ts'], { stdio: 'inherit', env }),
  spawn('node_modules/.bin/vite', [], { stdio: 'inherit', env }),
];

const stop = () => children.forEach((child) => child.kill('SIGTERM'));
process.on('SIGINT', stop);
process.on('SIGTERM', stop);
children.forEach((child) => child.on('exit', stop));

// `npm test`: types, lint, then every kind of test against the built application. Ends with one line that counts.
import { spawnSync } from 'node:child_process';
import { mkdirSync, readFileSync, rmSync } from 'node:fs';
import { ensureChromium } from './support/chromium.mjs';

const env = { ...process.env, CHROMIUM_PATH: ensureChromium(), TZ: 'UTC' };
const report = 'tests/.out/vitest.json';

function step(name, command, args) {
  const started = Date.now();
  console.log(`\n== ${name}`);
  const { status } = spawnSync(command, args, { stdio: 'inherit', env });
  console.log(`== ${name}: ${status === 0 ? 'ok' : 'failed'} in ${((Date.now() - started) / 1000).toFixed(1)} s`);
  return status === 0;
}

const bin = (name) => `node_modules/.bin/${name}`;
mkdirSync('tests/.out', { recursive: true });
rmSync(report, { force: true });

const sound =
  [
    step('types', bin('tsc'), ['--noEmit']),
    step('lint', bin('eslint'), ['.']),
    step('build', 'npm', ['run', '-s', 'build']),
  ].every(Boolean) &&
  step('tests', bin('vitest'), ['run', '--reporter=default', '--reporter=json', `--outputFile.json=${report}`]);

const { numPassedTests = 0, numFailedTests = 0, numPendingTests = 0 } = read(report);
console.log(`\n${numPassedTests} passed, ${numFailedTests} failed, ${numPendingTests} skipped`);
process.exit(sound && numPassedTests > 0 && numFailedTests === 0 ? 0 : 1);

function read(file) {
  try {
    return JSON.parse(readFileSync(file, 'utf8'));
  } catch {
    return {};
  }
}

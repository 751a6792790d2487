// Bundles the server's commands; packages stay outside the bundle and come from node_modules.
import { build } from 'esbuild';

await build({
  entryPoints: { main: 'server/main.ts', demo: 'server/demo/main.ts', 'producer-create': 'server/producer-create.ts' },
  outdir: 'dist/server',
  bundle: true,
  packages: 'external',
  platform: 'node',
  format: 'esm',
  target: 'node20',
  sourcemap: true,
  splitting: true,
  logLevel: 'warning',
});

import { installPackages } from '../server/dev/install-packages.mjs';

installPackages();
const { register } = await import('tsx/esm/api');
register();
const { runAll } = await import('./support/run-all.ts');
await runAll({ gate: true, suites: [] });

import { installPackages } from './install-packages.mjs';

installPackages();
const { register } = await import('tsx/esm/api');
register();
const { start } = await import('./start.ts');
await start(process.env);

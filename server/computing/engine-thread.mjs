import { tsImport } from 'tsx/esm/api';

// A thread does not inherit the loader that lets Node.js run TypeScript.
export const {
  assess,
  judgeBriefly,
  pickStations,
  judgeCandidates,
  findCures,
  breakthroughHours,
  fieldStrengths,
  designTracking,
  explainWhistle,
} = await tsImport('./engine-thread.ts', import.meta.url);

import { tsImport } from 'tsx/esm/api';

// A thread does not inherit the loader that lets Node.js run TypeScript.
export const { hashPassword, verifyPassword } = await tsImport(
  './password-hash.ts',
  import.meta.url,
);

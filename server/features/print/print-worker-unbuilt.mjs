import { tsImport } from 'tsx/esm/api';

/** In development and in tests the printing thread is read as it is written. */
await tsImport('./print-worker.ts', import.meta.url);

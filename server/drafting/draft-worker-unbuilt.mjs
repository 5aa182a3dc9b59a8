import { tsImport } from 'tsx/esm/api';

/** In development and in tests the drafting thread is read as it is written. */
await tsImport('./draft-worker.ts', import.meta.url);

import { clientFiles } from './http/client-files.ts';
import { runServer } from './run.ts';
import { places } from './settings.ts';

await runServer({ handler: clientFiles(places.client), strictHeaders: true });

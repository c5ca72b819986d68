/** Serves the last build on the port given; the browser journeys start it for themselves. */
import { endOnSignals } from './lib/project.mjs';
import { servePreview } from './lib/server.mjs';

endOnSignals();
await servePreview(Number(process.argv[2]));

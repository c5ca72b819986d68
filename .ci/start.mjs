/** `npm start`: installs what is missing, builds the program, serves it on this machine until told to stop. */
import { ensureInstalled } from './lib/install.mjs';
import { endOnSignals, portIsFree } from './lib/project.mjs';
import { buildProgram, servePreview } from './lib/server.mjs';

const usualPort = 4173;

async function choosePort() {
  const named = process.env.FILLWRIGHT_PORT;
  if (named !== undefined && named !== '') {
    const port = Number(named);
    if (!Number.isInteger(port) || port < 1 || port > 65535) {
      console.error(`FILLWRIGHT_PORT must be a port number from 1 to 65535; it is "${named}".`);
      process.exit(1);
    }
    if (await portIsFree(port)) return port;
    console.error(`Port ${port}, which FILLWRIGHT_PORT names, is taken by another program.`);
    process.exit(1);
  }
  let port = usualPort;
  while (!await portIsFree(port)) port += 1;
  if (port !== usualPort) {
    console.log(`Port ${usualPort} is taken, so this start uses ${port}. The browser keeps recipes per address:`
      + ` those saved under port ${usualPort} do not show here.`);
  }
  return port;
}

endOnSignals();
await ensureInstalled();
const port = await choosePort();
console.log('Building the program (a few seconds)…');
await buildProgram();
const server = await servePreview(port);
console.log(`Fillwright is ready: ${server.url}\nIt answers this machine only. Ctrl-C ends it.`);

// Opens Excel with the add-in served from this computer: npm run excel; take it out again: npm run excel -- stop
import { existsSync } from 'node:fs';
import { createServer } from 'node:https';
import path from 'node:path';
import { fileURLToPath } from 'node:url';
import { copyOfficeFiles } from './officeFiles.mjs';
import { serveFolder } from './serveFolder.mjs';

const here = path.dirname(fileURLToPath(import.meta.url));
const dist = path.join(path.dirname(here), 'dist');
const manifest = path.join(here, 'manifest.xml');
/** Fixed: the manifest names it. */
const PORT = 3000;

/** Why this computer cannot open Excel, or null. */
export function whyNot(platform) {
  if (platform === 'win32' || platform === 'darwin') return null;
  return [
    `npm run excel needs Excel on Windows or macOS; this is ${platform}.`,
    'Here, use the local page: npm start.',
    'For Excel on the web, pack the files for an HTTPS server (node manifest/pack.mjs https://host/path)',
    'and upload its manifest.xml in Excel: Home, Add-ins, More Add-ins, Upload My Add-in.',
  ].join('\n');
}

function listen(options) {
  return new Promise((resolve, reject) => {
    const server = createServer(options, (request, response) => void serveFolder(dist)(request, response));
    server.once('error', (error) => {
      const busy = `port ${PORT} is in use, and the manifest names it; stop the other program and try again`;
      reject(error.code === 'EADDRINUSE' ? new Error(busy) : error);
    });
    server.listen(PORT, 'localhost', () => resolve(server));
  });
}

async function start() {
  if (!existsSync(path.join(dist, 'taskpane.js'))) throw new Error('there is no build; run: npm run build');
  copyOfficeFiles(dist);
  const { getHttpsServerOptions } = await import('office-addin-dev-certs');
  const { AppType, startDebugging } = await import('office-addin-debugging');
  const server = await listen(await getHttpsServerOptions());
  console.error(`Serving the add-in at https://localhost:${PORT}; keep this open, Ctrl+C ends it.`);
  try {
    await startDebugging(manifest, { appType: AppType.Desktop, app: 'excel', enableDebugging: false });
  } catch (error) {
    server.close();
    throw new Error(`Excel could not be opened with the add-in (is Excel installed?): ${error.message}`);
  }
  process.once('SIGINT', () => {
    server.close();
    console.error('Stopped serving. Excel still lists the add-in; take it out with: npm run excel -- stop');
    process.exit(0);
  });
}

async function stop() {
  const { stopDebugging } = await import('office-addin-debugging');
  await stopDebugging(manifest);
}

if (process.argv[1] === fileURLToPath(import.meta.url)) {
  try {
    const obstacle = whyNot(process.platform);
    if (obstacle !== null) throw new Error(obstacle);
    await (process.argv[2] === 'stop' ? stop() : start());
  } catch (error) {
    console.error(error.message);
    process.exitCode = 1;
  }
}

/** How many ports are tried, one after the other. */
const MOST_TRIES = 50;

/**
 * Listens on this computer only, on the first port that is free.
 * @param {import('node:http').Server} server
 * @param {number} port Where to begin; 0 takes any.
 * @returns {Promise<number>} The port.
 */
export async function listen(server, port) {
  for (let next = port; next < port + MOST_TRIES; next++) {
    try {
      await new Promise((resolve, reject) => {
        server.once('error', reject);
        server.listen({ port: next, host: '127.0.0.1', exclusive: true }, () => {
          server.off('error', reject);
          resolve(undefined);
        });
      });
      return server.address().port;
    } catch (thrown) {
      if (thrown.code !== 'EADDRINUSE' && thrown.code !== 'EACCES') throw thrown;
    }
  }
  throw new Error(`no free port between ${port} and ${port + MOST_TRIES - 1}; name another with --port`);
}

import { createServer } from 'node:net';

/** Listens on a loopback port for a moment; gives the port, or null when it is taken. 0 asks the system for any. */
const probe = (port: number): Promise<number | null> =>
  new Promise((resolve) => {
    const server = createServer();
    server.once('error', () => resolve(null));
    server.listen(port, '127.0.0.1', () => {
      const address = server.address();
      server.close(() => resolve(address && typeof address === 'object' ? address.port : null));
    });
  });

/** Some loopback port that nobody listens on; throws when the system has none. */
export const freePort = async (): Promise<number> => {
  const port = await probe(0);
  if (port === null) throw new Error('The system gave no free port.');
  return port;
};

/** The first free loopback port from `wanted` on; throws after a hundred taken ones. */
export const firstFreePort = async (wanted: number): Promise<number> => {
  for (let port = wanted; port < wanted + 100; port++) if ((await probe(port)) !== null) return port;
  throw new Error(`No free port between ${wanted} and ${wanted + 99}.`);
};

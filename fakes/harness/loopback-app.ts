import { once } from 'node:events';
import type { Server } from 'node:http';
import type { AddressInfo } from 'node:net';
import type { Express } from 'express';
import express from 'express';

/** The port a listening server was given; throws where it listens on no TCP port. */
export function portOf(server: { address(): AddressInfo | string | null }): number {
  const address = server.address();
  if (address === null || typeof address === 'string') throw new Error('not listening on a port');
  return address.port;
}

/**
 * An Express app for a fake. It answers only when addressed as this computer, so that a page
 * elsewhere that points a name of its own at 127.0.0.1 reads nothing here.
 */
export function createLoopbackApp(): Express {
  const app = express();
  app.disable('x-powered-by');
  app.use((request, response, next) => {
    if (request.hostname !== '127.0.0.1' && request.hostname !== 'localhost') {
      response.status(421).type('text').send('This stand-in answers on 127.0.0.1 only.\n');
      return;
    }
    next();
  });
  return app;
}

/** Listens on 127.0.0.1; port 0 takes any free one. Rejects when the port is taken. */
export async function listen(app: Express, port: number): Promise<Server> {
  const server = app.listen(port, '127.0.0.1');
  await once(server, 'listening');
  return server;
}

/** Stops a server at once, idle keep-alive connections included. */
export async function close(server: Server): Promise<void> {
  const closed = once(server, 'close');
  server.close();
  server.closeAllConnections();
  await closed;
}

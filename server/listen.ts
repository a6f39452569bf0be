import type { Express } from 'express';
import type { Server } from 'node:http';
import type { AddressInfo } from 'node:net';

/** Starts listening; port 0 takes a free one. Resolves with the server and its address. */
export function listen(
  app: Express,
  port: number,
  host: string,
): Promise<{ server: Server; url: string; port: number }> {
  return new Promise((resolve, reject) => {
    const server = app.listen(port, host, (error?: Error) => {
      if (error) {
        reject(error);
        return;
      }
      const taken = (server.address() as AddressInfo).port;
      resolve({ server, url: `http://${host === '0.0.0.0' ? 'localhost' : host}:${taken}`, port: taken });
    });
  });
}

import { createServer, type IncomingMessage, type Server, type ServerResponse } from 'node:http';
import { builtFile } from '../served/builtFile.ts';
import { securityHeaders, WINDOW_POLICY } from '../served/contentSecurity.ts';

/** Only this machine can reach it. */
const LOOPBACK = '127.0.0.1';

/** A file handed to the page as a copy, under a path that cannot be guessed. */
export interface GivenFile {
  readonly key: string;
  readonly name: string;
  readonly text: string;
}

export interface LoopbackSetting {
  /** The built window. */
  readonly folder: string;
  readonly given: GivenFile | null;
  /** Taken when it is free; null, or taken already, lets the system choose one. */
  readonly port: number | null;
}

export interface Loopback {
  readonly port: number;
  /** Of the window, with the given file in it if there is one. */
  readonly address: string;
  close(): Promise<void>;
}

/** Serves the built window to a browser on this machine, and to nobody else. */
export async function serveLoopback(setting: LoopbackSetting): Promise<Loopback> {
  const server = createServer((request, response) => {
    void answer(request, response, setting, portOf(server));
  });
  try {
    await listen(server, setting.port ?? 0);
  } catch (error) {
    if (setting.port === null) throw error;
    await listen(server, 0);
  }
  const port = portOf(server);
  const query = setting.given === null ? '' : `?given=${setting.given.key}`;
  return {
    port,
    address: `http://${LOOPBACK}:${port}/${query}`,
    close: () =>
      new Promise((resolve) => {
        server.close(() => resolve());
        server.closeAllConnections();
      }),
  };
}

async function answer(
  request: IncomingMessage,
  response: ServerResponse,
  setting: LoopbackSetting,
  port: number,
): Promise<void> {
  // Another name in Host means that some page's own domain was pointed at this machine to read what is served here.
  const host = request.headers.host;
  if (host !== `${LOOPBACK}:${port}` && host !== `localhost:${port}`)
    return send(response, 403, 'text/plain', 'Only for this machine.');
  if (request.method !== 'GET' && request.method !== 'HEAD')
    return send(response, 405, 'text/plain', 'Only reading is served here.');

  // Cut off by hand: `URL` would quietly tidy up a path that tries to climb out.
  const [pathname = '/'] = (request.url ?? '/').split(/[?#]/);
  const { given } = setting;
  if (given !== null && pathname === `/given/${given.key}`) {
    const body = JSON.stringify({ name: given.name, text: given.text });
    return send(response, 200, 'application/json; charset=utf-8', body);
  }
  const file = await builtFile(setting.folder, pathname);
  if (file === null) return send(response, 404, 'text/plain', 'Not there.');
  send(response, 200, file.type, file.bytes);
}

function send(response: ServerResponse, status: number, type: string, body: string | Uint8Array): void {
  response.writeHead(status, { 'Content-Type': type, ...securityHeaders(WINDOW_POLICY) });
  // Node leaves the body out by itself when only the head was asked for.
  response.end(body);
}

function listen(server: Server, port: number): Promise<void> {
  return new Promise((resolve, reject) => {
    server.once('error', reject);
    server.listen(port, LOOPBACK, () => {
      server.removeListener('error', reject);
      resolve();
    });
  });
}

function portOf(server: Server): number {
  const address = server.address();
  if (address === null || typeof address === 'string') throw new Error('the server listens on no port');
  return address.port;
}

import { randomUUID } from 'node:crypto';
import type { Protocol } from 'electron';
import { builtFile } from '../served/builtFile.ts';
import { REPORT_POLICY, securityHeaders, WINDOW_POLICY } from '../served/contentSecurity.ts';

const SCHEME = 'app';
const WINDOW_HOST = 'tautline';
const REPORT_HOST = 'report';

export const WINDOW_ADDRESS = `${SCHEME}://${WINDOW_HOST}/index.html`;

/** Whether an address is a page of the window's own origin. */
export function isWindowAddress(address: string): boolean {
  return URL.canParse(address) && hostOf(new URL(address)) === WINDOW_HOST;
}

/** Must run before the app is ready. */
export function claimAppScheme(protocol: Protocol): void {
  protocol.registerSchemesAsPrivileged([
    { scheme: SCHEME, privileges: { standard: true, secure: true, supportFetchAPI: true, codeCache: true } },
  ]);
}

/** Pages that are served from memory while they are printed. */
export interface ReportPages {
  /** Returns the address of the page and how to take it away again. */
  show(html: string): { readonly address: string; withdraw(): void };
}

/** Serves the built window under app://tautline, and reports under app://report; nothing else is there. */
export function serveApp(protocol: Protocol, rendererFolder: string): ReportPages {
  const pages = new Map<string, string>();

  protocol.handle(SCHEME, async (request) => {
    if (request.method !== 'GET' && request.method !== 'HEAD')
      return answer(405, 'text/plain', 'Only reading is served here.');
    const address = new URL(request.url);
    switch (hostOf(address)) {
      case WINDOW_HOST: {
        const file = await builtFile(rendererFolder, address.pathname);
        return file === null
          ? answer(404, 'text/plain', 'Not there.')
          : answer(200, file.type, file.bytes, WINDOW_POLICY);
      }
      case REPORT_HOST: {
        const html = pages.get(address.pathname);
        return html === undefined
          ? answer(404, 'text/plain', 'Not there.', REPORT_POLICY)
          : answer(200, 'text/html; charset=utf-8', html, REPORT_POLICY);
      }
      default:
        return answer(404, 'text/plain', 'Not there.');
    }
  });

  return {
    show(html) {
      const pathname = `/${randomUUID()}`;
      pages.set(pathname, html);
      return {
        address: `${SCHEME}://${REPORT_HOST}${pathname}`,
        withdraw: () => void pages.delete(pathname),
      };
    },
  };
}

function hostOf(address: URL): string | null {
  return address.protocol === `${SCHEME}:` ? address.host : null;
}

function answer(
  status: number,
  type: string,
  body: string | Uint8Array<ArrayBuffer>,
  policy = WINDOW_POLICY,
): Response {
  return new Response(body, { status, headers: { 'Content-Type': type, ...securityHeaders(policy) } });
}

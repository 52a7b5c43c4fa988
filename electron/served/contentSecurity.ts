/**
 * What the window's page may load: its own files only. Styles may stand inline (components measure and place
 * themselves); pictures and fonts may be carried as data; nothing comes from the network and no script stands inline.
 */
export const WINDOW_POLICY = [
  "default-src 'none'",
  "script-src 'self'",
  "worker-src 'self'",
  "style-src 'self' 'unsafe-inline'",
  "font-src 'self' data:",
  "img-src 'self' data: blob:",
  "connect-src 'self'",
  "frame-src 'self'",
  "manifest-src 'self'",
  "base-uri 'none'",
  "form-action 'none'",
  "frame-ancestors 'none'",
  "object-src 'none'",
].join('; ');

/** A report is paper: text, styles, drawings and fonts it carries itself. No script at all. */
export const REPORT_POLICY = [
  "default-src 'none'",
  "style-src 'unsafe-inline'",
  'font-src data:',
  'img-src data:',
  "base-uri 'none'",
  "form-action 'none'",
  "frame-ancestors 'none'",
].join('; ');

/** Headers that go with every answer under a policy. */
export function securityHeaders(policy: string): Readonly<Record<string, string>> {
  return {
    'Content-Security-Policy': policy,
    'X-Content-Type-Options': 'nosniff',
    'Referrer-Policy': 'no-referrer',
    'Cross-Origin-Opener-Policy': 'same-origin',
    'Cross-Origin-Resource-Policy': 'same-origin',
    'Cache-Control': 'no-cache',
  };
}

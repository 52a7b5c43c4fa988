/**
 * A plain Chromium knows no app:// scheme of ours. Pages of the stand-in live under http://HOST.app.localhost, which
 * Chromium trusts as it trusts this machine; main and its handlers see app://HOST, as in Electron.
 */
const PLAIN = /^http:\/\/([^./]+)\.app\.localhost/;
const OURS = /^app:\/\/([^/]+)/;

export function plainAddress(address: string): string {
  return address.replace(OURS, 'http://$1.app.localhost');
}

export function appAddress(address: string): string {
  return address.replace(PLAIN, 'app://$1');
}

export function isPlainAppAddress(address: string): boolean {
  return PLAIN.test(address);
}

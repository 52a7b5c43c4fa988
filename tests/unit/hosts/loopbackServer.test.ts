import { mkdir, mkdtemp, rm, symlink, writeFile } from 'node:fs/promises';
import { request } from 'node:http';
import { connect } from 'node:net';
import os from 'node:os';
import path from 'node:path';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { type Loopback, serveLoopback } from '../../../electron/loopback/server.ts';

const given = { key: '0b5a2c1e-6d0f-4d5e-9c38-1c7b1a2f3e4d', name: 'shed.json', text: '{"shed": "Lane"}' };
let folder: string;
let loopback: Loopback;
beforeAll(async () => {
  folder = await mkdtemp(path.join(os.tmpdir(), 'tautline-served-'));
  const built = path.join(folder, 'built');
  await mkdir(path.join(built, 'assets'), { recursive: true });
  await writeFile(path.join(folder, 'secret.txt'), 'secret');
  await writeFile(path.join(built, 'index.html'), '<p>window</p>');
  await writeFile(path.join(built, 'assets', 'main.js'), 'export {}');
  await symlink(path.join(folder, 'secret.txt'), path.join(built, 'link.txt'));
  loopback = await serveLoopback({ folder: built, given, port: null });
});
afterAll(async () => {
  await loopback.close();
  await rm(folder, { recursive: true });
});

interface Answer {
  readonly status: number;
  readonly body: string;
  readonly headers: NodeJS.Dict<string | string[]>;
}

/** Sends the path as it is written: `fetch` would tidy it up first. */
function get(at: string, headers: Record<string, string> = {}, method = 'GET'): Promise<Answer> {
  return new Promise((resolve, reject) => {
    const asked = request({ host: '127.0.0.1', port: loopback.port, path: at, method, headers }, (answer) => {
      let body = '';
      answer.on('data', (part: Buffer) => {
        body += part.toString();
      });
      answer.on('end', () => resolve({ status: answer.statusCode ?? 0, body, headers: answer.headers }));
    });
    asked.on('error', reject);
    asked.end();
  });
}

describe('the local server', () => {
  it('serves the built window, each file as what it is', async () => {
    expect(await get('/')).toMatchObject({ status: 200, body: '<p>window</p>' });
    const script = await get('/assets/main.js?v=1');
    expect(script.status).toBe(200);
    // A browser runs a module only when it comes as a script.
    expect(script.headers['content-type']).toMatch(/^text\/javascript/);
  });

  it('sends the policy that keeps scripts to its own files with every answer', async () => {
    for (const at of ['/', '/assets/main.js', '/missing', `/given/${given.key}`]) {
      const { headers } = await get(at);
      expect(headers['content-security-policy']).toContain("script-src 'self'");
      expect(headers['content-security-policy']).not.toContain('unsafe-eval');
      expect(headers['x-content-type-options']).toBe('nosniff');
    }
  });

  it.each(['evil.example', '192.168.1.4', '127.0.0.1', '127.0.0.1:1', 'localhost.evil.example:80'])(
    'refuses a request that calls it "%s"',
    async (host) => {
      expect((await get('/', { Host: host })).status).toBe(403);
    },
  );

  it('answers to both names of this machine', async () => {
    for (const host of ['127.0.0.1', 'localhost'])
      expect((await get('/', { Host: `${host}:${loopback.port}` })).status).toBe(200);
  });

  it.each([
    '/../secret.txt',
    '/assets/../../secret.txt',
    '/%2e%2e/secret.txt',
    '/..%2fsecret.txt',
    '/%2e%2e%2fsecret.txt',
    '/..\\secret.txt',
    '/..%5csecret.txt',
    '/link.txt',
    '//secret.txt',
    '/%00',
    '/%',
    '/C:/secret.txt',
    '/assets',
  ])('gives nothing away at %s', async (at) => {
    const answer = await get(at);
    expect(answer.status).toBe(404);
    expect(answer.body).not.toContain('secret');
  });

  it('changes nothing: only reading is served', async () => {
    for (const method of ['POST', 'PUT', 'DELETE', 'OPTIONS'])
      expect((await get('/', {}, method)).status).toBe(405);
    expect(await get('/', {}, 'HEAD')).toMatchObject({ status: 200, body: '' });
  });

  it('hands over the given file under its key alone', async () => {
    expect(loopback.address).toBe(`http://127.0.0.1:${loopback.port}/?given=${given.key}`);
    const { status, body } = await get(`/given/${given.key}`);
    expect(status).toBe(200);
    expect(JSON.parse(body)).toEqual({ name: 'shed.json', text: '{"shed": "Lane"}' });
    expect((await get('/given/')).status).toBe(404);
    expect((await get(`/given/${given.key.slice(0, -1)}0`)).status).toBe(404);
  });

  it('cannot be reached from other machines', async () => {
    const outside = Object.values(os.networkInterfaces())
      .flat()
      .find((one) => one?.family === 'IPv4' && !one.internal)?.address;
    // A machine without a network has no other way in, and nothing to refuse.
    if (outside === undefined) return;
    const reached = await new Promise<boolean>((resolve) => {
      const socket = connect({ host: outside, port: loopback.port });
      socket.on('connect', () => resolve(true));
      socket.on('error', () => resolve(false));
    });
    expect(reached).toBe(false);
  });

  it('takes the port it is given when that is free, and another one when it is not', async () => {
    const built = path.join(folder, 'built');
    const second = await serveLoopback({ folder: built, given: null, port: loopback.port });
    expect(second.port).not.toBe(loopback.port);
    await second.close();
    const again = await serveLoopback({ folder: built, given: null, port: second.port });
    expect(again.port).toBe(second.port);
    await again.close();
  });
});

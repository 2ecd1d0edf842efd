import { type ChildProcess, spawn } from 'node:child_process';
import { once } from 'node:events';
import { createServer } from 'node:http';
import type { AddressInfo } from 'node:net';
import { expect, it, onTestFinished } from 'vitest';
import { temporaryFolder } from '../setup/hub.ts';

/** Starts the hub as a process of its own and gathers what it says. */
function start(env: Record<string, string>) {
  const child = spawn(process.execPath, ['--import', 'tsx', 'server/main.ts'], {
    env: { ...process.env, NODE_ENV: '', STEELYARD_DATA: temporaryFolder(), PORT: '0', ...env },
  });
  onTestFinished(() => void child.kill('SIGKILL'));
  const said = { out: '', error: '' };
  child.stdout.on('data', (data) => {
    said.out += data;
  });
  child.stderr.on('data', (data) => {
    said.error += data;
  });
  return { child, said };
}

async function ended(child: ChildProcess): Promise<number | null> {
  if (child.exitCode !== null) return child.exitCode;
  const [code] = await once(child, 'exit');
  return code;
}

/** The address that the hub says it is ready on. */
async function ready({ child, said }: ReturnType<typeof start>): Promise<string> {
  for (;;) {
    const address = /ready on (http:\S+)/.exec(said.out)?.[1];
    if (address) return address;
    if (child.exitCode !== null) throw new Error(said.error);
    await new Promise((resolve) => setTimeout(resolve, 50));
  }
}

it('says where it is, serves, and stops when asked, closing the database', async () => {
  const hub = start({});
  const address = await ready(hub);
  const health = await fetch(`${address.replace('localhost', '127.0.0.1')}/api/v1/health`);
  expect(await health.json()).toMatchObject({ status: 'ok' });
  hub.child.kill('SIGTERM');
  expect(await ended(hub.child)).toBe(0);
  expect(hub.said).toMatchObject({ error: '', out: expect.stringContaining('Stopping.') });
});

it('says in words, without a stack, that a setting cannot be', async () => {
  const { child, said } = start({ PORT: 'abc' });
  expect(await ended(child)).toBe(1);
  expect(said.error).toContain('PORT');
  expect(said.error).not.toMatch(/\n\s+at /);
});

it('says in words that the port is in use', async () => {
  const other = createServer().listen(0, '127.0.0.1');
  onTestFinished(() => void other.close());
  await once(other, 'listening');
  const { child, said } = start({ PORT: String((other.address() as AddressInfo).port) });
  expect(await ended(child)).toBe(1);
  expect(said.error).toContain('The port is in use');
});

import { type ChildProcess, spawn } from 'node:child_process';
import { once } from 'node:events';
import { expect, it, onTestFinished } from 'vitest';
import { temporaryFolder } from '../setup/hub.ts';

/** What the process says that matches, or null when it ends first. */
function says(child: ChildProcess, pattern: RegExp): Promise<RegExpExecArray | null> {
  let said = '';
  return new Promise((resolve) => {
    child.once('exit', () => resolve(null));
    child.stdout?.on('data', (data) => {
      said += data;
      const match = pattern.exec(said);
      if (match) resolve(match);
    });
  });
}

async function answers(address: string): Promise<boolean> {
  return fetch(`${address}/api/v1/health`).then(
    ({ ok }) => ok,
    () => false,
  );
}

it('npm start serves, and its hub goes when npm is told to stop', async () => {
  const npm = spawn('npm', ['start'], {
    env: { ...process.env, PORT: '0', HOST: '127.0.0.1', STEELYARD_DATA: temporaryFolder() },
    stdio: ['ignore', 'pipe', 'inherit'],
  });
  onTestFinished(() => void npm.kill('SIGKILL'));
  const port = (await says(npm, /ready on http:\/\/localhost:(\d+)/))?.[1];
  const address = `http://127.0.0.1:${port}`;
  expect(await answers(address)).toBe(true);
  npm.kill('SIGTERM');
  await once(npm, 'exit');
  await expect.poll(() => answers(address), { timeout: 10_000 }).toBe(false);
}, 120_000);

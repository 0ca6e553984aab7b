import { spawn } from 'node:child_process';
import { once } from 'node:events';
import path from 'node:path';
import { describe, expect, it } from 'vitest';
import { readBirth } from '../../scripts/lib/lock.mjs';
import { run, startProcess, stopProcess } from '../../scripts/lib/processes.mjs';

const node = (code: string) => run(process.execPath, ['-e', code]);

const library = path.resolve(import.meta.dirname, '../../scripts/lib');

/** One that ended but whose new parent hasn't asked for it yet is gone. */
const isAlive = (pid: number): boolean => readBirth(pid) !== null;

async function waitUntilGone(pid: number): Promise<boolean> {
  for (let waits = 0; waits < 100 && isAlive(pid); waits += 1)
    await new Promise((resolve) => setTimeout(resolve, 50));
  return !isAlive(pid);
}

/** Starts a command that itself starts a long-lived process and prints its number. */
async function startCommand() {
  const source = `
    import { runCommand } from ${JSON.stringify(`${library}/lifetime.mjs`)};
    import { startProcess, stopProcess } from ${JSON.stringify(`${library}/processes.mjs`)};
    await runCommand(async (lifetime) => {
      const running = startProcess('sleep', ['300'], { stdio: 'ignore' });
      lifetime.defer(() => stopProcess(running, 1000));
      lifetime.defer(() => console.log('cleaned up'));
      setInterval(() => {}, 1000);
      console.log(running.child.pid);
    });`;
  const command = spawn(process.execPath, ['--input-type=module', '-e', source], {
    stdio: ['ignore', 'pipe', 'inherit'],
  });
  let output = '';
  command.stdout.setEncoding('utf8').on('data', (text: string) => (output += text));
  while (!output.includes('\n')) await once(command.stdout, 'data');
  return { command, pid: Number(output.split('\n')[0]), readOutput: () => output };
}

describe('running a program', () => {
  it('answers its exit code and what it wrote', async () => {
    const ended = await node('console.log("out"); console.error("err"); process.exitCode = 3');
    expect(ended.code).toBe(3);
    expect(ended.stdout).toBe('out\n');
    expect(ended.output).toContain('err');
  });

  it('answers a failure when there is no such program', async () => {
    expect((await run('/nowhere/program', [])).code).not.toBe(0);
  });

  it('makes a program end that does not listen', async () => {
    const running = startProcess(
      process.execPath,
      ['-e', 'process.on("SIGTERM", () => {}); console.log("up"); setInterval(() => {}, 1000)'],
      { stdio: ['ignore', 'pipe', 'inherit'] },
    );
    if (running.child.stdout) await once(running.child.stdout, 'data');
    expect(await stopProcess(running, 200)).toEqual({ code: null, signal: 'SIGKILL' });
  });
});

describe('a command', () => {
  it.each(['SIGINT', 'SIGTERM', 'SIGHUP'] as const)('ends what it started on %s', async (signal) => {
    const { command, pid, readOutput } = await startCommand();
    command.kill(signal);
    const [code] = (await once(command, 'exit')) as [number | null];
    expect(code).toBe(0);
    expect(isAlive(pid)).toBe(false);
    expect(readOutput()).toContain('cleaned up');
  });

  it('takes what it started with it even when it is killed', async () => {
    const { command, pid } = await startCommand();
    command.kill('SIGKILL');
    await once(command, 'exit');
    expect(await waitUntilGone(pid)).toBe(true);
  });
});

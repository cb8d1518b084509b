import { spawn } from 'node:child_process';

import { Explained, ROOT } from './project.mjs';

/** What the system says when a disk is full, in the programs that we call. */
const DISK_FULL = /ENOSPC|No space left on device/i;

/**
 * Runs a program to its end and collects what it prints.
 *
 * @param options.show true: print its output as it comes; otherwise it is kept and shown only on failure
 * @returns `{ code, output }`; never throws for a non-zero code
 */
export function run(command, args, { show = false, signal, ...options } = {}) {
  return new Promise((resolve, reject) => {
    const child = spawn(command, args, { cwd: ROOT, stdio: ['ignore', 'pipe', 'pipe'], signal, ...options });
    let output = '';
    const collect = chunk => {
      output += chunk;
      if (show) process.stderr.write(chunk);
    };
    child.stdout.on('data', collect);
    child.stderr.on('data', collect);
    child.on('error', reject);
    child.on('close', code => resolve({ code: code ?? 1, output }));
  });
}

/** As {@link run}, but a non-zero code is an explained failure with the end of what was printed. */
export async function mustRun(what, command, args, options) {
  const { code, output } = await run(command, args, options);
  if (code === 0) return output;
  if (DISK_FULL.test(output)) {
    throw new Explained(
      `${what} stopped: the disk is full. Free some space and run the same command again; what was finished before is kept.`,
    );
  }
  throw new Explained(
    `${what} failed (exit code ${code}):\n${output.trim().split('\n').slice(-30).join('\n')}`,
  );
}

import { spawnSync } from 'node:child_process';
import { rmSync } from 'node:fs';
import path from 'node:path';

import { buildSync } from 'esbuild';

/** What a run of the command line said and how it ended. */
export interface Ended {
  readonly status: number | null;
  readonly stdout: string;
  readonly stderr: string;
}

/** The `move` command line, bundled from the sources as they are. */
export class CommandLine {
  /** Inside node_modules, where the bundle finds its packages. */
  readonly program: string;

  constructor(name: string) {
    this.program = path.resolve(`node_modules/.cache/fairlead-test/${name}-${process.pid}.mjs`);
    buildSync({
      entryPoints: ['server/cli/main.ts'],
      outfile: this.program,
      bundle: true,
      platform: 'node',
      format: 'esm',
      target: 'node20',
      packages: 'external',
      logLevel: 'error',
    });
  }

  run(args: readonly string[], input: string | Buffer = ''): Ended {
    const { status, stdout, stderr } = spawnSync(process.execPath, [this.program, ...args], {
      input,
      maxBuffer: 1 << 28,
    });
    return { status, stdout: stdout.toString('utf8'), stderr: stderr.toString('utf8') };
  }

  remove(): void {
    rmSync(this.program, { force: true });
  }
}

import { existsSync } from 'node:fs';

import { Explained } from './project.mjs';
import { mustRun } from './run.mjs';
import { step } from './say.mjs';

/**
 * Finds a program, or installs it from Debian's packages where that may be done.
 *
 * @param find returns what was found, or undefined
 * @param packages Debian packages that bring it
 * @param what the program's name for people
 * @returns what `find` returned
 * @throws Explained with the one line to run, where the machine is not Debian's or we are not root
 */
export async function ensureProgram({ find, packages, what }) {
  const found = find();
  if (found) return found;
  const line = `apt-get install --no-install-recommends ${packages.join(' ')}`;
  if (process.getuid?.() !== 0 || !existsSync('/usr/bin/apt-get')) {
    throw new Explained(
      `${what} is missing. Install it (on Debian: sudo ${line}) and run the same command again.`,
    );
  }
  await step(`Installing ${what} from Debian's packages`, () => aptInstall(packages));
  const installed = find();
  if (!installed) throw new Explained(`${what} was installed but cannot be found. Try: ${line}`);
  return installed;
}

/** The lock's time-out matters: apt fails at once while another apt is at work. */
async function aptInstall(packages) {
  const options = { env: { ...process.env, DEBIAN_FRONTEND: 'noninteractive' } };
  const wait = ['-q', '-o', 'DPkg::Lock::Timeout=300', '-o', 'Acquire::Retries=3'];
  await mustRun('apt-get update', 'apt-get', [...wait, 'update'], options);
  await mustRun(
    'apt-get install',
    'apt-get',
    [...wait, 'install', '-y', '--no-install-recommends', ...packages],
    options,
  );
}

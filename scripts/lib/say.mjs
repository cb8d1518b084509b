/** Progress for people, on standard error, so that standard output stays free for data. */
export function say(line) {
  process.stderr.write(`${line}\n`);
}

/**
 * Runs one step of the set-up and says what it was and how long it took.
 *
 * @param label what is done, in the words of a person
 * @param work returns (a promise of) the step's result; steps quicker than 0.3 s stay silent
 */
export async function step(label, work) {
  const began = performance.now();
  const timer = setTimeout(() => say(`  … ${label}`), 1500);
  try {
    return await work();
  } finally {
    clearTimeout(timer);
    const seconds = (performance.now() - began) / 1000;
    if (seconds > 0.3) say(`  ${label}: ${seconds.toFixed(1)} s`);
  }
}

/** Ends the process with what went wrong; a stack only where the fault is ours. */
export function fail(error) {
  say(error?.constructor?.name === 'Explained' ? `\n${error.message}` : `\n${error?.stack ?? error}`);
  process.exitCode = 1;
}

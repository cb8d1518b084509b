import { oneLine, ReaderGone } from './output';
import { UsageError } from './usage';
import { UnknownDeliverable } from '#shared/document/deliverable-named';

type Verb = (args: readonly string[]) => number | Promise<number>;

/** Each verb in a file of its own, loaded when it is asked for: `check` should not wait for what `export` needs. */
const VERBS: Readonly<Record<string, () => Promise<Verb>>> = {
  check: async () => (await import('./verbs/check')).check,
  bake: async () => (await import('./verbs/bake')).bake,
  export: async () => (await import('./verbs/export')).exportMove,
  apply: async () => (await import('./verbs/apply')).apply,
  frame: async () => (await import('./verbs/frame')).frame,
  render: async () => (await import('./verbs/render')).render,
  measure: async () => (await import('./verbs/measure')).measure,
};

async function run([name, ...args]: readonly string[]): Promise<number> {
  const load = name !== undefined && Object.hasOwn(VERBS, name) ? VERBS[name] : undefined;
  if (!load)
    throw new UsageError(`move VERB FILE [options], where VERB is one of ${Object.keys(VERBS).join(', ')}.`);
  return (await load())(args);
}

try {
  process.exitCode = await run(process.argv.slice(2));
} catch (error) {
  if (error instanceof ReaderGone) process.exitCode = 0;
  else if (error instanceof UsageError || error instanceof UnknownDeliverable) {
    process.stderr.write(`${oneLine(error.message)}\n`);
    process.exitCode = 2;
  } else throw error;
}

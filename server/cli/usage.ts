/** Bad input: told in one line on standard error; exit code 2. */
export class UsageError extends Error {}

/** A verb's words: its file, its options and its flags. */
export interface Words {
  readonly file: string;
  readonly options: ReadonlyMap<string, string>;
  readonly flags: ReadonlySet<string>;
}

/**
 * Reads `FILE [--option value]… [--flag]…`.
 *
 * @param args what follows the verb
 * @param known names of the options that the verb takes, each with a value
 * @param knownFlags names of those that stand alone
 * @throws UsageError
 */
export function readWords(
  args: readonly string[],
  known: readonly string[],
  knownFlags: readonly string[] = [],
): Words {
  const files: string[] = [];
  const options = new Map<string, string>();
  const flags = new Set<string>();
  for (let i = 0; i < args.length; i++) {
    const word = args[i];
    if (!word.startsWith('--')) {
      files.push(word);
      continue;
    }
    const [name, inline] = word.slice(2).split(/=(.*)/s);
    if (knownFlags.includes(name) && inline === undefined) {
      flags.add(name);
      continue;
    }
    if (!known.includes(name))
      throw new UsageError(`${word} is not an option of this verb${listed([...known, ...knownFlags])}.`);
    const value = inline ?? args[++i];
    if (value === undefined) throw new UsageError(`--${name} wants a value.`);
    options.set(name, value);
  }
  if (files.length !== 1)
    throw new UsageError(`Name one FILE (or - for standard input), not ${files.length}.`);
  return { file: files[0], options, flags };
}

function listed(known: readonly string[]): string {
  return known.length > 0 ? `; it takes ${known.map(name => `--${name}`).join(', ')}` : '';
}

/** @throws UsageError where an option that the verb needs is missing */
export function wanted(words: Words, name: string): string {
  const value = words.options.get(name);
  if (value === undefined || value === '') throw new UsageError(`--${name} is missing.`);
  return value;
}

/**
 * @param allowed the values that an option may have, the default first
 * @throws UsageError
 */
export function choice<T extends string>(words: Words, name: string, allowed: readonly [T, ...T[]]): T {
  const given = words.options.get(name) ?? allowed[0];
  const found = allowed.find(value => value === given);
  if (found === undefined)
    throw new UsageError(`--${name} is one of ${allowed.join(', ')}, not ${JSON.stringify(given)}.`);
  return found;
}

/**
 * @param fallback what counts where the option is left out; none: it must be given
 * @throws UsageError where it is no number
 */
export function numberOption(words: Words, name: string, fallback?: number): number {
  const given = words.options.get(name);
  if (given === undefined && fallback !== undefined) return fallback;
  const text = wanted(words, name);
  const value = text.trim() === '' ? NaN : Number(text);
  if (!Number.isFinite(value)) throw new UsageError(`--${name} is a number, not ${JSON.stringify(text)}.`);
  return value;
}

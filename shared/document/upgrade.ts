import { type Fault, shown } from './fault';

/** Takes a document of one version to the next. Gets documents that nobody has checked yet, and leaves them as they are. */
export type Upgrade = (document: object) => object;

/** A format's name and its way from version to version. */
export interface FormatVersions {
  readonly format: string;
  /** The first takes version 1 to 2, and so on; as many as it takes to reach the version that this program writes. */
  readonly upgrades: readonly Upgrade[];
}

/** @returns the version that this program writes */
export function latestVersion({ upgrades }: FormatVersions): number {
  return upgrades.length + 1;
}

/**
 * Takes a document to the latest version of its format. Whatever is no document of a known version is handed on as it
 * is, for the schema to speak about.
 *
 * @returns the document in its latest version, or the one fault that leaves nothing else to be said: another format, or
 *   a version of a later program
 */
export function upgraded(
  value: object,
  versions: FormatVersions,
): { readonly value: object } | { readonly fault: Fault } {
  const { format, version }: { format?: unknown; version?: unknown } = value;
  if (typeof format === 'string' && format !== versions.format)
    return { fault: otherFormat(format, versions) };
  const latest = latestVersion(versions);
  if (typeof version !== 'number') return { value };
  if (version > latest) {
    const detail = `is ${version}, written by a newer Fairlead; this one reads up to version ${latest}`;
    return { fault: { pointer: '/version', detail } };
  }
  if (!Number.isInteger(version) || version < 1) return { value };
  return { value: versions.upgrades.slice(version - 1).reduce((document, step) => step(document), value) };
}

function otherFormat(format: string, versions: FormatVersions): Fault {
  return { pointer: '/format', detail: `must be ${shown(versions.format)}, is ${shown(format)}` };
}

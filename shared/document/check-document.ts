import { type SchemaValidator } from '#schemas/schema-validator';
import { type Fault, shown } from './fault';
import { jsonFaults } from './json-faults';
import { readablePart } from './readable-part';
import { schemaFaults } from './schema-faults';
import { partOf, partsOf } from './unsure';
import { type FormatVersions, upgraded } from './upgrade';

/** A format of ours: what it is called, its versions, its schema and what the schema cannot say. */
export interface DocumentKind<T> extends FormatVersions {
  /** "a move document". */
  readonly noun: string;
  readonly validate: SchemaValidator<T>;
  /**
   * @param keyCount how many keys there are; more than the document holds where the rest was not read
   */
  readonly ruleFaults: (document: object, keyCount: number | undefined) => Fault[];
}

export type CheckedAs<T> =
  { readonly ok: true; readonly document: T } | { readonly ok: false; readonly faults: Fault[] };

/**
 * Checks whether a value is a document of a kind.
 *
 * @param value anything, such as parsed JSON of unknown origin
 * @returns the document as it is (in its latest version; nothing is filled in or taken out), or all its faults, each
 *   with its pointer; never throws
 */
export function checkDocument<T>(value: unknown, kind: DocumentKind<T>): CheckedAs<T> {
  if (typeof value !== 'object' || value === null || Array.isArray(value)) {
    return refuse([{ pointer: '', detail: `must be ${kind.noun} (an object), is ${shown(value)}` }]);
  }
  const latest = upgraded(value, kind);
  if ('fault' in latest) return refuse([latest.fault]);
  const readable = readablePart(latest.value);
  if (readable.monstrous) return refuse(readable.faults);
  const { validate } = kind;
  const document: unknown = readable.value;
  const matches = validate(document);
  const faults = [
    ...readable.faults,
    ...(matches ? [] : schemaFaults(document, validate.errors ?? [])),
    ...kind.ruleFaults(readable.value, readable.keyCount),
    ...extensionFaults(readable.value),
  ];
  return matches && faults.length === 0 ? { ok: true, document } : refuse(faults);
}

/** In every part that may have them. */
function extensionFaults(document: { readonly [name: string]: unknown } | object): Fault[] {
  const whole = partOf(document);
  const keys = partsOf(whole['keys']);
  const parts: [unknown, string][] = [
    [whole, ''],
    [whole['shot'], '/shot'],
    ...partsOf(whole['deliverables']).map((each, i): [unknown, string] => [each, `/deliverables/${i}`]),
    ...keys.flatMap((key, i): [unknown, string][] => [
      [key, `/keys/${i}`],
      [key['leg'], `/keys/${i}/leg`],
    ]),
  ];
  return parts.flatMap(([part, pointer]) => {
    const extensions = partOf(part)['extensions'];
    return extensions === undefined ? [] : jsonFaults(extensions, `${pointer}/extensions`);
  });
}

/** By pointer, so that a person reads a document's faults from top to bottom; numbers count as numbers. */
function refuse(faults: readonly Fault[]): { readonly ok: false; readonly faults: Fault[] } {
  const byNumber = new Intl.Collator('en', { numeric: true });
  return { ok: false, faults: [...faults].sort((a, b) => byNumber.compare(a.pointer, b.pointer)) };
}

import { type SchemaFault } from '#schemas/schema-validator';
import { type Fault, pointerTo, shown, valueAt } from './fault';

/**
 * What a schema found, as sentences for people.
 *
 * @param root the value that was validated
 * @param errors all of a validator's errors
 * @returns one fault for each thing wrong: of a choice (`anyOf`) what tells most, not each branch's refusal
 */
export function schemaFaults(root: unknown, errors: readonly SchemaFault[]): Fault[] {
  const choices = new Map<string, Choice>();
  for (const error of errors) {
    if (error.keyword === 'anyOf')
      choices.set(placeOf(error.instancePath, error.schemaPath), { error, refusals: [] });
  }
  const alone = errors.filter(error => {
    const choice = error.keyword === 'anyOf' ? undefined : choiceAround(choices, error);
    choice?.refusals.push(error);
    return !choice && error.keyword !== 'anyOf';
  });
  return [
    ...alone.map(error => sentence(root, error)),
    ...[...choices.values()].flatMap(choice => choiceFaults(root, choice)),
  ];
}

/** A choice that no branch of it allowed, and why each refused. */
interface Choice {
  readonly error: SchemaFault;
  readonly refusals: SchemaFault[];
}

function placeOf(instancePath: string, schemaPath: string): string {
  return `${instancePath}\n${schemaPath}`;
}

/** @returns the innermost choice that an error is a branch's refusal of */
function choiceAround(choices: ReadonlyMap<string, Choice>, error: SchemaFault): Choice | undefined {
  const end = error.schemaPath.lastIndexOf('/anyOf/');
  if (end < 0) return undefined;
  const schemaPath = error.schemaPath.slice(0, end + '/anyOf'.length);
  for (let path = error.instancePath; ; path = path.slice(0, path.lastIndexOf('/'))) {
    const choice = choices.get(placeOf(path, schemaPath));
    if (choice || path === '') return choice;
  }
}

/** A branch that was wrong further in, or only in the value's size, is the one that was meant. */
function choiceFaults(root: unknown, { error, refusals }: Choice): Fault[] {
  const inside = refusals.filter(refusal => refusal.instancePath !== error.instancePath);
  if (inside.length > 0) return inside.map(refusal => sentence(root, refusal));
  const given = shown(valueAt(root, error.instancePath));
  const must = (what: string): Fault[] => [
    { pointer: error.instancePath, detail: `must be ${what}, is ${given}` },
  ];
  if (error.schemaPath.endsWith('/ease/anyOf')) return must(EASES);
  const fitting = refusals.filter(({ keyword }) => keyword !== 'type');
  if (fitting.length > 0) return fitting.map(refusal => sentence(root, refusal));
  return must(refusals.map(({ params }) => typeName(params['type'])).join(' or '));
}

const TYPE_NAMES: Readonly<Record<string, string>> = {
  number: 'a number',
  integer: 'a whole number',
  string: 'text',
  boolean: 'true or false',
  object: 'an object',
  array: 'a list',
};

function typeName(type: unknown): string {
  return TYPE_NAMES[String(type)] ?? String(type);
}

const EASES = '"fair", "linear", "hold", a CSS easing keyword or {"bezier": [x1, y1, x2, y2]}';

function sentence(root: unknown, { keyword, instancePath, params }: SchemaFault): Fault {
  const given = shown(valueAt(root, instancePath));
  const at = (detail: string, pointer = instancePath): Fault => ({ pointer, detail });
  const member = (name: string) => pointerTo(instancePath, String(params[name]));
  switch (keyword) {
    case 'required':
      return at('is missing', member('missingProperty'));
    case 'additionalProperties':
      return at(
        'is not a member that this format knows; members of other programs belong under "extensions"',
        member('additionalProperty'),
      );
    case 'type':
      return at(`must be ${typeName(params['type'])}, is ${given}`);
    case 'const':
      return at(`must be ${shown(params['allowedValue'])}, is ${given}`);
    case 'enum':
      return at(`must be one of ${list(params['allowedValues'])}, is ${given}`);
    case 'minimum':
    case 'maximum':
    case 'exclusiveMinimum':
    case 'exclusiveMaximum':
      return at(
        `must be ${COMPARISONS[String(params['comparison'])]} ${String(params['limit'])}, is ${given}`,
      );
    case 'minItems':
    case 'maxItems':
      return at(
        `must have ${atMost(keyword)} ${String(params['limit'])} entries, has ${lengthOf(root, instancePath)}`,
      );
    case 'minLength':
    case 'maxLength':
      return at(
        `must have ${atMost(keyword)} ${String(params['limit'])} signs, has ${lengthOf(root, instancePath)}`,
      );
    case 'pattern':
      return at(`must look like ${String(params['pattern'])}, is ${given}`);
    default:
      return at(`does not fit (${keyword}), is ${given}`);
  }
}

const COMPARISONS: Readonly<Record<string, string>> = {
  '>=': 'at least',
  '<=': 'at most',
  '>': 'over',
  '<': 'under',
};

function atMost(keyword: string): string {
  return keyword.startsWith('min') ? 'at least' : 'at most';
}

function lengthOf(root: unknown, pointer: string): number {
  const value = valueAt(root, pointer);
  if (Array.isArray(value)) return value.length;
  let signs = 0;
  if (typeof value === 'string') for (const _sign of value) signs++;
  return signs;
}

function list(values: unknown): string {
  return Array.isArray(values) ? values.map(shown).join(', ') : shown(values);
}

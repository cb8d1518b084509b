import { type SchemaFault } from '#schemas/schema-validator';
import { type Fault, pointerTo, shown, valueAt } from './fault';

/**
 * What a schema found, as sentences for people.
 *
 * @param root the value that was validated
 * @param errors all of a validator's errors
 * @returns one fault for each thing wrong: of a choice (`anyOf`) the choice's own fault, not each branch's
 */
export function schemaFaults(root: unknown, errors: readonly SchemaFault[]): Fault[] {
  const choices = errors.filter(error => error.keyword === 'anyOf');
  const inBranch = (error: SchemaFault) =>
    choices.some(choice => error !== choice && error.schemaPath.startsWith(`${choice.schemaPath}/`));
  const explained = (choice: SchemaFault) =>
    errors.some(error => inBranch(error) && error.instancePath.startsWith(`${choice.instancePath}/`));
  return errors
    .filter(error => {
      if (error.keyword === 'anyOf') return !explained(error);
      const choice = choices.find(each => error.schemaPath.startsWith(`${each.schemaPath}/`));
      return !choice || error.instancePath.length > choice.instancePath.length;
    })
    .map(error => sentence(root, error));
}

const TYPE_NAMES: Readonly<Record<string, string>> = {
  number: 'a number',
  integer: 'a whole number',
  string: 'text',
  boolean: 'true or false',
  object: 'an object',
  array: 'a list',
};

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
      return at(`must be ${TYPE_NAMES[String(params['type'])] ?? String(params['type'])}, is ${given}`);
    case 'const':
      return at(`must be ${shown(params['allowedValue'])}, is ${given}`);
    case 'enum':
      return at(`must be one of ${list(params['allowedValues'])}, is ${given}`);
    case 'anyOf':
      return at(`must be ${EASES}, is ${given}`);
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
  return typeof value === 'string' ? Array.from(value).length : 0;
}

function list(values: unknown): string {
  return Array.isArray(values) ? values.map(shown).join(', ') : shown(values);
}

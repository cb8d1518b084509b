import { Ajv2020, type ValidateFunction } from 'ajv/dist/2020.js';
import { schemaFaults } from '#shared/document/schema-faults';
import { type MoveDraft, type MoveSave } from '#schemas/api/moves';
import { type SignIn } from '#schemas/api/session';
import { type ShootChanges, type ShootDraft } from '#schemas/api/shoots';
import { type ShotChanges, type ShotDraft } from '#schemas/api/shots';
import { API_SCHEMAS } from './api-schemas';
import { invalid } from './problem';

/** The bodies that requests may have. */
export interface Bodies {
  SignIn: SignIn;
  ShootDraft: ShootDraft;
  ShootChanges: ShootChanges;
  ShotDraft: ShotDraft;
  ShotChanges: ShotChanges;
  MoveDraft: MoveDraft;
  MoveSave: MoveSave;
}
export type BodyName = keyof Bodies;

const FILES: Readonly<Record<BodyName, string>> = {
  SignIn: 'session',
  ShootDraft: 'shoots',
  ShootChanges: 'shoots',
  ShotDraft: 'shots',
  ShotChanges: 'shots',
  MoveDraft: 'moves',
  MoveSave: 'moves',
};

const ajv = new Ajv2020({ allErrors: true, schemas: API_SCHEMAS });

/** Of a body with very many faults (each key of a long list), these are told. */
const MOST_FAULTS = 100;

/**
 * Checks a request's body against its schema.
 *
 * @throws Problem 422 with every fault and its pointer
 */
export function checkBody<B extends BodyName>(name: B, value: unknown): Bodies[B] {
  const validate = validatorOf(name);
  if (validate(value)) return value;
  throw invalid(schemaFaults(value, validate.errors ?? []).slice(0, MOST_FAULTS));
}

function validatorOf<B extends BodyName>(name: B): ValidateFunction<Bodies[B]> {
  const validate = ajv.getSchema<Bodies[B]>(`${FILES[name]}.schema.json#/$defs/${name}`);
  if (!validate) throw new Error(`There is no schema of ${name}`);
  return validate;
}

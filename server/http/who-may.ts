import { type Role } from '#schemas/api/session';

/** Whom a route answers: anybody, anybody who is signed in, or people of the crew by their role. */
export type Allowed = 'anybody' | 'signed-in' | readonly Role[];

const SEE: readonly Role[] = ['lead', 'operator', 'editor'];
const MAKE: readonly Role[] = ['lead', 'operator'];
const LEAD: readonly Role[] = ['lead'];

/**
 * Who may do what: the one table. A reviewer sees what was sent to them, and nothing can be sent yet.
 */
export const WHO_MAY = {
  'health.see': 'anybody',
  'api.see': 'anybody',
  'session.see': 'anybody',
  'session.begin': 'anybody',
  'session.end': 'signed-in',
  'shoots.see': SEE,
  'shoots.create': MAKE,
  'shoots.edit': MAKE,
  'shoots.delete': LEAD,
  'shots.see': SEE,
  'shots.create': MAKE,
  'shots.edit': MAKE,
  'shots.delete': LEAD,
  'plates.see': SEE,
  'plates.create': MAKE,
  'plates.delete': MAKE,
  'moves.see': SEE,
  'moves.create': MAKE,
  'moves.edit': MAKE,
  'moves.delete': MAKE,
} as const satisfies Record<string, Allowed>;

export type Action = keyof typeof WHO_MAY;

/** What everybody may do, and what only people of a crew may. */
export type CrewAction = { [A in Action]: (typeof WHO_MAY)[A] extends string ? never : A }[Action];
export type OpenAction = Exclude<Action, CrewAction>;

/** @returns whether the role may do it within its crew */
export function roleMay(role: Role, action: CrewAction): boolean {
  return WHO_MAY[action].includes(role);
}

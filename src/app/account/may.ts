import { type Role } from '#schemas/api/session';

/** What pages offer or leave out by role. The server has its own table and the last word. */
export type Action = 'see' | 'edit' | 'delete';

const ALLOWED: Readonly<Record<Action, readonly Role[]>> = {
  see: ['lead', 'operator', 'editor'],
  edit: ['lead', 'operator'],
  delete: ['lead'],
};

export function may(role: Role, action: Action): boolean {
  return ALLOWED[action].includes(role);
}

import { type Knex } from 'knex';
import { type Role } from '#schemas/api/session';
import { hashPassword } from '../../../server/accounts/passwords';
import { uuidV7 } from '../../../server/db/uuid-v7';

export const PASSWORD = 'correct horse of the quay';
export const ROLES: readonly Role[] = ['lead', 'operator', 'editor', 'reviewer'];

/** A crew with one person for each role, named `<role>@<crew>.example`. */
export interface TestCrew {
  readonly id: string;
  readonly userIds: Readonly<Record<Role, string>>;
  emailOf(role: Role): string;
}

let hashed: Promise<string> | undefined;

export async function makeCrew(db: Knex, name: string): Promise<TestCrew> {
  hashed ??= hashPassword(PASSWORD);
  const passwordHash = await hashed;
  const id = uuidV7();
  const emailOf = (role: Role) => `${role}@${name}.example`;
  const userIds = { lead: uuidV7(), operator: uuidV7(), editor: uuidV7(), reviewer: uuidV7() };
  await db('crews').insert({ id, name });
  await db('users').insert(
    ROLES.map(role => ({
      id: userIds[role],
      name: `${name} ${role}`,
      email: emailOf(role),
      password_hash: passwordHash,
    })),
  );
  await db('memberships').insert(ROLES.map(role => ({ crew_id: id, user_id: userIds[role], role })));
  return { id, userIds, emailOf };
}

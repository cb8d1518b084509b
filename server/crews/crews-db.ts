import { type Knex } from 'knex';
import { type Membership, type Role } from '#schemas/api/session';

/** @returns the person's role in the crew, or undefined where they do not belong to it */
export async function findRole(db: Knex, userId: string, crewId: string): Promise<Role | undefined> {
  const found = await db<{ crew_id: string; user_id: string; role: Role }>('memberships')
    .where({ crew_id: crewId, user_id: userId })
    .first('role');
  return found?.role;
}

/** @returns the person's crews, by name */
export async function listMemberships(db: Knex, userId: string): Promise<Membership[]> {
  return db('memberships')
    .join('crews', 'crews.id', 'memberships.crew_id')
    .where('memberships.user_id', userId)
    .orderBy('crews.name')
    .select<Membership[]>({ crewId: 'crews.id', crewName: 'crews.name', role: 'memberships.role' });
}

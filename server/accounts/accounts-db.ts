import { type Knex } from 'knex';

interface UserRow {
  id: string;
  name: string;
  email: string;
  password_hash: string;
  session_epoch: number;
}

/** A person with an account. */
export interface Account {
  readonly id: string;
  readonly name: string;
  readonly email: string;
  /** A session of an earlier epoch has ended. */
  readonly sessionEpoch: number;
}

const accountFrom = (row: UserRow): Account => ({
  id: row.id,
  name: row.name,
  email: row.email,
  sessionEpoch: row.session_epoch,
});

export async function findAccount(db: Knex, id: string): Promise<Account | undefined> {
  const row = await db<UserRow>('users').where({ id }).first();
  return row && accountFrom(row);
}

/** @param email in any case */
export async function findAccountByEmail(
  db: Knex,
  email: string,
): Promise<{ account: Account; passwordHash: string } | undefined> {
  const row = await db<UserRow>('users').whereRaw('lower(email) = lower(?)', [email]).first();
  return row && { account: accountFrom(row), passwordHash: row.password_hash };
}

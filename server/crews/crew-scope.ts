import { type Knex } from 'knex';
import { type Role } from '#schemas/api/session';
import { recordAudit } from '../db/audit';

/** Tables whose rows belong to a crew, and whether deleting there only marks. */
const CREW_TABLES = { shoots: true, shots: true, plates: true, plate_versions: false, moves: true } as const;

export type CrewTable = keyof typeof CREW_TABLES;

/** Tables with a revision, which several people may edit. */
type RevisedTable = 'shoots' | 'shots' | 'moves';

/** Who acts, and as what. */
export interface Member {
  readonly userId: string;
  readonly userName: string;
  readonly crewId: string;
  readonly role: Role;
}

/**
 * The database as one member of one crew may touch it. Every query that it hands out is already bound to the crew and
 * to rows that are not deleted, so that no caller can reach another crew's rows by forgetting a clause. Routes and
 * services are never given the bare connection.
 */
export class CrewScope {
  readonly #db: Knex;

  constructor(
    db: Knex,
    readonly member: Member,
  ) {
    this.#db = db;
  }

  /** The crew's live rows of a table, to select from. */
  rows<Row extends object>(table: CrewTable): Knex.QueryBuilder<Row, Row[]> {
    const rows = this.#db<Row, Row[]>(table).where(`${table}.crew_id`, this.member.crewId);
    if (CREW_TABLES[table]) void rows.whereNull(`${table}.deleted_at`);
    return rows;
  }

  async insert(table: CrewTable, row: Readonly<Record<string, unknown>>): Promise<void> {
    await this.#db(table).insert({ ...row, crew_id: this.member.crewId });
  }

  /**
   * Changes a row that is still at the revision its editor saw.
   *
   * @returns false where it is not there, deleted, or at another revision
   */
  async change(
    table: RevisedTable,
    { id, revision }: { readonly id: string; readonly revision: number },
    changes: Readonly<Record<string, unknown>>,
  ): Promise<boolean> {
    const changed = await this.rows(table)
      .where({ id, revision })
      .update({ ...changes, revision: revision + 1, updated_at: this.#db.fn.now() });
    return changed === 1;
  }

  /** Marks live rows as deleted. @returns their ids */
  async softDelete(
    table: Exclude<CrewTable, 'plate_versions'>,
    column: string,
    values: readonly string[],
  ): Promise<string[]> {
    if (values.length === 0) return [];
    const gone: { id: string }[] = await this.#db(table)
      .where('crew_id', this.member.crewId)
      .whereNull('deleted_at')
      .whereIn(column, values)
      .update({ deleted_at: this.#db.fn.now(), updated_at: this.#db.fn.now() })
      .returning('id');
    return gone.map(row => row.id);
  }

  /** Notes who did what, for the crew's audit log. */
  async record(
    action: string,
    subjectId: string,
    detail: Readonly<Record<string, unknown>> = {},
  ): Promise<void> {
    const { crewId, userId } = this.member;
    await recordAudit(this.#db, { crewId, userId, action, subjectId, detail });
  }

  /** All of it or nothing of it. */
  async transaction<T>(work: (scope: CrewScope) => Promise<T>): Promise<T> {
    return this.#db.transaction(trx => work(new CrewScope(trx, this.member)));
  }

  /** Keeps others who ask for the same name out until the transaction ends. */
  async lock(name: string): Promise<void> {
    await this.#db.raw('select pg_advisory_xact_lock(hashtextextended(?, 0))', [name]);
  }
}

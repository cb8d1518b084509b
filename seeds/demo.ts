import { type Knex } from 'knex';
import { checkMove } from '#shared/document/validate';
import { type MoveDocument } from '#schemas/move';
import { hashPassword } from '../server/accounts/passwords';
import { CrewScope } from '../server/crews/crew-scope';
import { uuidV7 } from '../server/db/uuid-v7';
import { insertMove } from '../server/moves/moves-db';
import { insertPlate } from '../server/plates/plates-db';
import { insertShoot } from '../server/shoots/shoots-db';
import { documentShot, factsOf, shotFaults, type ShotFacts } from '../server/shots/shot-facts';
import { insertShot } from '../server/shots/shots-db';
import { DEMO_CREW, DEMO_PASSWORD, DEMO_PEOPLE, type DemoPerson } from './demo-crew';
import { DEMO_MOVES, type DemoMove } from './demo-moves';
import { type DemoPictures, type DemoPlate, makeDemoPlate } from './demo-plates';
import { DEMO_SHOOTS, type DemoShoot, type DemoShot, type DemoVariant } from './demo-shots';

type Plates = Readonly<Record<DemoVariant, DemoPlate>>;

/** What all rows of the demo share. */
interface Seeding {
  readonly plates: Plates;
  readonly nextId: () => string;
}

/**
 * Seeds the demo where there is no crew yet. The pictures come first, then all rows in one transaction: killed at any
 * moment, the next run does it whole.
 *
 * @param say takes short lines for a person who waits
 * @returns whether it was seeded now
 */
export async function seedDemo(
  db: Knex,
  pictures: DemoPictures,
  say: (line: string) => void,
): Promise<boolean> {
  if (await hasCrew(db)) return false;
  const plates: Plates = {
    'blue-hour': await painted(pictures, 'blue-hour', say),
    'deep-night': await painted(pictures, 'deep-night', say),
  };
  const passwordHash = await hashPassword(DEMO_PASSWORD);
  const seeded = await db.transaction(async trx => {
    await trx.raw('lock table crews in exclusive mode');
    if (await hasCrew(trx)) return false;
    await seedRows(trx, plates, passwordHash);
    return true;
  });
  if (seeded)
    say(`Seeded the demo crew ${DEMO_CREW}: ${DEMO_SHOOTS.length} shoots, ${DEMO_MOVES.length} moves`);
  return seeded;
}

async function hasCrew(db: Knex): Promise<boolean> {
  return (await db<{ id: string }>('crews').first('id')) !== undefined;
}

async function painted(
  pictures: DemoPictures,
  variant: DemoVariant,
  say: (line: string) => void,
): Promise<DemoPlate> {
  let told = 0;
  say(`Painting Vesper Haven, ${variant.replace('-', ' ')}`);
  return makeDemoPlate(pictures, variant, done => {
    const quarter = Math.floor(done * 4);
    if (quarter > told && quarter < 4) say(`  ${quarter * 25} %`);
    told = Math.max(told, quarter);
  });
}

async function seedRows(trx: Knex, plates: Plates, passwordHash: string): Promise<void> {
  const crewId = uuidV7();
  await trx('crews').insert({ id: crewId, name: DEMO_CREW });
  const people = DEMO_PEOPLE.map(person => ({ id: uuidV7(), ...person }));
  for (const { id, name, email, role } of people) {
    await trx('users').insert({ id, name, email, password_hash: passwordHash });
    await trx('memberships').insert({ crew_id: crewId, user_id: id, role });
  }
  const scopeOf = ({ id, name, role }: DemoPerson & { readonly id: string }) =>
    new CrewScope(trx, { userId: id, userName: name, crewId, role });
  const [lead, operator] = people;
  if (!lead || !operator) throw new Error('The demo has a lead and an operator');
  await scopeOf(lead).record('crew.created', crewId);
  const seeding = { plates, nextId: risingIds() };
  for (const shoot of DEMO_SHOOTS) await seedShoot(scopeOf(operator), shoot, seeding);
}

async function seedShoot(scope: CrewScope, shoot: DemoShoot, seeding: Seeding): Promise<void> {
  const id = seeding.nextId();
  await insertShoot(scope, id, shoot.facts);
  // Lists begin with the newest.
  for (const shot of [...shoot.shots].reverse()) await seedShot(scope, id, shot, seeding);
}

async function seedShot(
  scope: CrewScope,
  shootId: string,
  shot: DemoShot,
  { plates, nextId }: Seeding,
): Promise<void> {
  const facts = factsOf(shot.facts);
  const faults = shotFaults(facts);
  if (faults.length > 0) throw new Error(`The demo’s shot ${facts.title}: ${JSON.stringify(faults)}`);
  const shotId = nextId();
  await insertShot(scope, shotId, shootId, facts);
  for (const { frame, variant } of shot.plates) {
    await insertPlate(scope, { ...plates[variant], id: uuidV7(), shotId, frame });
  }
  const moves = DEMO_MOVES.filter(move => move.shot === shot.name).reverse();
  for (const move of moves) await insertMove(scope, nextId(), shotId, documentOf(move, facts));
}

function documentOf({ title, notes, deliverables, keys }: DemoMove, facts: ShotFacts): MoveDocument {
  const shot = documentShot(facts);
  const checked = checkMove({ format: 'fairlead.move', version: 1, title, notes, shot, deliverables, keys });
  if (!checked.ok) throw new Error(`The demo’s move ${title}: ${JSON.stringify(checked.faults)}`);
  return checked.document;
}

/** Makes identifiers that each come later than the one before: what is seeded last is listed first. */
function risingIds(): () => string {
  let lastMs = 0;
  return () => {
    lastMs = Math.max(Date.now(), lastMs + 1);
    return uuidV7(lastMs);
  };
}

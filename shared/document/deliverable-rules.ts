import { type Deliverable } from '#schemas/move';
import { type Fault, shown } from './fault';
import { eachPart, type Unsure } from './unsure';

/** @returns what is wrong with a document's deliverables beyond their schema */
export function deliverableFaults(deliverables: unknown): Fault[] {
  const names = new Map<unknown, number>();
  return eachPart(deliverables, ({ name, match }: Unsure<Deliverable>, i) => {
    const faults: Fault[] = [];
    const wrong = (member: string, detail: string) =>
      faults.push({ pointer: `/deliverables/${i}/${member}`, detail });
    if (i === 0 && match !== undefined)
      wrong('match', 'must be left out: the first deliverable is the one that the keys were made for');
    if (i > 0 && match === undefined) wrong('match', 'is missing: "width", "height" or "diagonal"');
    const first = names.get(name);
    if (typeof name === 'string' && first !== undefined) {
      wrong('name', `must be unique, is ${shown(name)} as /deliverables/${first} is`);
    } else names.set(name, i);
    return faults;
  });
}

import { type Deliverable, type MoveDocument } from '#schemas/move';

/** Thrown where a deliverable is asked for by a name that the document does not have. */
export class UnknownDeliverable extends Error {
  constructor(name: string, document: MoveDocument) {
    const names = document.deliverables.map(each => JSON.stringify(each.name)).join(', ');
    super(`The move has no deliverable ${JSON.stringify(name)}; it has ${names}.`);
  }
}

/**
 * @param name a deliverable's name; the first unless said
 * @throws UnknownDeliverable
 */
export function deliverableNamed(document: MoveDocument, name?: string): Deliverable {
  const found =
    name === undefined ? document.deliverables[0] : document.deliverables.find(each => each.name === name);
  if (!found) throw new UnknownDeliverable(name ?? '', document);
  return found;
}

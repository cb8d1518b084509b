// Made by `npm run generate` from the JSON Schema of the same name. Not to be edited.
/**
 * Bodies of the shoot routes, one member each
 */
export interface ShootBodies {
  shoot?: Shoot;
  shootDraft?: ShootDraft;
  shootChanges?: ShootChanges;
  shootPage?: ShootPage;
}
/**
 * A shoot of the crew
 */
export interface Shoot {
  /**
   * The shoot: a UUID
   */
  id: string;
  /**
   * One line, not blank; 1 to 200 signs
   */
  title: string;
  /**
   * Where it was shot; up to 200 signs
   */
  place: string;
  /**
   * Free text; up to 20,000 signs
   */
  notes: string;
  /**
   * First day of the shoot, YYYY-MM-DD; null where it is not set
   */
  startsOn: string | null;
  /**
   * Its shots: a count
   */
  shotCount: number;
  /**
   * The moves of its shots: a count
   */
  moveCount: number;
  /**
   * A picture of it; null while there is no plate
   */
  cover: PlatePicture | null;
  /**
   * A count, one more after every change; it is also the ETag
   */
  revision: number;
  /**
   * When it was made: an instant, ISO 8601 in UTC
   */
  createdAt: string;
  /**
   * When it was last changed: an instant, ISO 8601 in UTC
   */
  updatedAt: string;
}
/**
 * A plate as a small picture
 */
export interface PlatePicture {
  /**
   * The plate: a UUID
   */
  plateId: string;
  /**
   * Up to 512 pixels wide
   */
  thumbUrl: string;
  /**
   * Up to 2048 pixels wide
   */
  url2048: string;
}
/**
 * A shoot to be made
 */
export interface ShootDraft {
  /**
   * One line, not blank; 1 to 200 signs
   */
  title: string;
  /**
   * Where it was shot; up to 200 signs
   */
  place?: string;
  /**
   * Free text; up to 20,000 signs
   */
  notes?: string;
  /**
   * First day of the shoot, YYYY-MM-DD; null where it is not set
   */
  startsOn?: string | null;
}
/**
 * What to change of a shoot; what is left out stays
 */
export interface ShootChanges {
  /**
   * One line, not blank; 1 to 200 signs
   */
  title?: string;
  /**
   * Where it was shot; up to 200 signs
   */
  place?: string;
  /**
   * Free text; up to 20,000 signs
   */
  notes?: string;
  /**
   * First day of the shoot, YYYY-MM-DD; null where it is not set
   */
  startsOn?: string | null;
}
/**
 * A page of shoots, newest first
 */
export interface ShootPage {
  items: Shoot[];
  /**
   * Give it as `after` to get the next page; null on the last page
   */
  next: string | null;
}

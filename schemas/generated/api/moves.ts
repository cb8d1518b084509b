// Made by `npm run generate` from the JSON Schema of the same name. Not to be edited.
/**
 * A move to be made: from a document, or fresh with one key
 */
export type MoveDraft =
  | {
      /**
       * A move document (move.schema.json); unknown members only under "extensions"
       */
      document: {};
    }
  | {
      /**
       * One line, not blank; 1 to 200 signs
       */
      title: string;
    };

/**
 * Bodies of the move routes, one member each
 */
export interface MoveBodies {
  move?: Move;
  moveList?: MoveList;
  moveDraft?: MoveDraft;
  moveSave?: MoveSave;
}
/**
 * A stored move and its document
 */
export interface Move {
  /**
   * The move: a UUID
   */
  id: string;
  /**
   * Its shot: a UUID
   */
  shotId: string;
  /**
   * Its shoot: a UUID
   */
  shootId: string;
  /**
   * Its crew: a UUID
   */
  crewId: string;
  /**
   * The document’s title
   */
  title: string;
  /**
   * A count, one more after every change; it is also the ETag
   */
  revision: number;
  /**
   * A move document (move.schema.json); unknown members only under "extensions"
   */
  document: {};
  /**
   * When it was last saved: an instant, ISO 8601 in UTC
   */
  updatedAt: string;
  updatedBy: Person;
}
/**
 * Who did it
 */
export interface Person {
  /**
   * The person: a UUID
   */
  id: string;
  name: string;
}
/**
 * A shot’s moves, last saved first
 */
export interface MoveList {
  items: MoveSummary[];
}
/**
 * A stored move without its document
 */
export interface MoveSummary {
  /**
   * The move: a UUID
   */
  id: string;
  /**
   * Its shot: a UUID
   */
  shotId: string;
  /**
   * The document’s title
   */
  title: string;
  /**
   * A count, one more after every change; it is also the ETag
   */
  revision: number;
  /**
   * Its keys: a count
   */
  keyCount: number;
  /**
   * When it was last saved: an instant, ISO 8601 in UTC
   */
  updatedAt: string;
  updatedBy: Person;
}
/**
 * The whole document, to take the place of the stored one
 */
export interface MoveSave {
  /**
   * A move document (move.schema.json); unknown members only under "extensions"
   */
  document: {};
}

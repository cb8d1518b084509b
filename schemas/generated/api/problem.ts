// Made by `npm run generate` from the JSON Schema of the same name. Not to be edited.
/**
 * The body of every error answer
 */
export interface ProblemBodies {
  problem?: Problem;
}
/**
 * Problem details (RFC 9457); a 412 also carries the present state as `current`
 */
export interface Problem {
  /**
   * What kind of problem, a path to switch on
   */
  type: string;
  /**
   * The kind in words
   */
  title: string;
  /**
   * The HTTP status code
   */
  status: number;
  /**
   * What happened here, what was kept, what to do
   */
  detail: string;
  /**
   * The request’s path
   */
  instance: string;
  /**
   * For a body: each fault
   */
  errors?: Fault[];
}
/**
 * One fault of a body
 */
export interface Fault {
  /**
   * JSON Pointer (RFC 6901) to the member
   */
  pointer: string;
  /**
   * What is wanted, and what came
   */
  detail: string;
}

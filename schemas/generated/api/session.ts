// Made by `npm run generate` from the JSON Schema of the same name. Not to be edited.
/**
 * What the person is in the crew
 */
export type Role = 'lead' | 'operator' | 'editor' | 'reviewer';

/**
 * Bodies of the session routes, one member each
 */
export interface SessionBodies {
  signIn?: SignIn;
  session?: Session;
  health?: Health;
}
/**
 * What a person signs in with
 */
export interface SignIn {
  /**
   * E-mail address, any case
   */
  email: string;
  /**
   * The password as typed
   */
  password: string;
}
/**
 * Who is signed in, and where they belong
 */
export interface Session {
  /**
   * null while nobody is signed in
   */
  user: User | null;
  memberships: Membership[];
}
/**
 * A person with an account
 */
export interface User {
  /**
   * The person: a UUID
   */
  id: string;
  name: string;
  email: string;
}
/**
 * A crew that the person belongs to, and as what
 */
export interface Membership {
  /**
   * The crew: a UUID
   */
  crewId: string;
  crewName: string;
  role: Role;
}
/**
 * The server and its database answer
 */
export interface Health {
  ok: true;
}

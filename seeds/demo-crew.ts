import { type Role } from '#schemas/api/session';

/** An invented crew in an invented town. */
export const DEMO_CREW = 'Lantern Quay';

/** Of the demo alone; `npm start` prints it. */
export const DEMO_PASSWORD = 'lantern-quay';

export interface DemoPerson {
  readonly name: string;
  readonly email: string;
  readonly role: Role;
}

export const DEMO_PEOPLE: readonly DemoPerson[] = [
  { name: 'Ines Varga', email: 'ines@lantern-quay.example', role: 'lead' },
  { name: 'Tomas Reed', email: 'tomas@lantern-quay.example', role: 'operator' },
  { name: 'Maren Holt', email: 'maren@lantern-quay.example', role: 'editor' },
  { name: 'Oskar Lindqvist', email: 'oskar@lantern-quay.example', role: 'reviewer' },
];

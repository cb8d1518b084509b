import moves from '../../schemas/api/moves.schema.json';
import plates from '../../schemas/api/plates.schema.json';
import problem from '../../schemas/api/problem.schema.json';
import session from '../../schemas/api/session.schema.json';
import shoots from '../../schemas/api/shoots.schema.json';
import shots from '../../schemas/api/shots.schema.json';

/** The schemas of all bodies: what validates them also describes them. */
export const API_SCHEMAS = [session, shoots, shots, plates, moves, problem];

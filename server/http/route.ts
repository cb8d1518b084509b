import { type Request, type RequestHandler, type Response } from 'express';
import { type CrewScope } from '../crews/crew-scope';
import { type Bodies, type BodyName, checkBody } from './bodies';
import { type CrewAction, type OpenAction } from './who-may';

export type Method = 'get' | 'post' | 'put' | 'patch' | 'delete';

/** What a handler answers; undefined where it has streamed its answer itself. */
export interface Answer {
  readonly status: number;
  readonly body?: unknown;
  readonly headers?: Readonly<Record<string, string>>;
}

/** What the API's description says of a route. */
interface Described {
  readonly method: Method;
  /** Below `/api`; a crew route's below `/api/crews/:crewId`. */
  readonly path: string;
  readonly summary: string;
  readonly body?: BodyName | 'upload';
  /** Status and schema name, or media type, of the good answer. */
  readonly answer: readonly [status: number, what?: string];
}

export interface OpenCall {
  readonly req: Request;
  readonly res: Response;
}

export interface CrewCall extends OpenCall {
  readonly scope: CrewScope;
}

export interface OpenRoute extends Described {
  readonly kind: 'open';
  readonly action: OpenAction;
  run(call: OpenCall): Promise<Answer | undefined>;
}

export interface CrewRoute extends Described {
  readonly kind: 'crew';
  readonly action: CrewAction;
  /** What reads the body where it is not JSON; runs after the guards. */
  readonly before?: readonly RequestHandler[];
  run(call: CrewCall): Promise<Answer | undefined>;
}

export type Route = OpenRoute | CrewRoute;

type CrewRouteParts = Omit<CrewRoute, 'kind' | 'run' | 'body'>;

/** A route of a crew without a body, or with one that it reads itself. */
export function crewRoute(
  parts: CrewRouteParts & { readonly body?: 'upload' },
  run: (call: CrewCall) => Promise<Answer | undefined>,
): CrewRoute {
  return { kind: 'crew', ...parts, run };
}

/** A route of a crew that takes JSON: its handler gets the body checked. */
export function crewRouteWithBody<B extends BodyName>(
  parts: CrewRouteParts & { readonly body: B },
  run: (call: CrewCall, body: Bodies[B]) => Promise<Answer | undefined>,
): CrewRoute {
  return { kind: 'crew', ...parts, run: call => run(call, checkBody(parts.body, call.req.body)) };
}

/** A revisioned thing as an answer: its revision is its ETag. */
export function revised(status: number, body: { readonly revision: number }): Answer {
  return { status, body, headers: { ETag: `"${body.revision}"` } };
}

/** A value of the path, such as `shootId`. */
export function pathValue(req: Request, name: string): string {
  const value = req.params[name];
  if (typeof value !== 'string') throw new Error(`The path has no :${name}`);
  return value;
}

import { API_SCHEMAS } from './api-schemas';
import { fullPath } from './register';
import { type Route } from './route';
import { WHO_MAY } from './who-may';

const JSON_TYPE = 'application/json';

/** The API's description (OpenAPI 3.1), from the schemas and the routes that really are. */
export function openApi(routes: readonly Route[]): object {
  const paths: Record<string, Record<string, object>> = {};
  for (const route of routes) {
    const path = fullPath(route).replace(/:(\w+)/g, '{$1}');
    paths[path] = { ...paths[path], [route.method]: operation(route, path) };
  }
  return {
    openapi: '3.1.0',
    info: { title: 'Fairlead', version: '1', description: 'Camera moves through spherical footage.' },
    paths,
    components: {
      schemas: components(),
      securitySchemes: { session: { type: 'apiKey', in: 'cookie', name: 'sid' } },
    },
  };
}

function operation(route: Route, path: string): object {
  const allowed = WHO_MAY[route.action];
  const who = typeof allowed === 'string' ? allowed : `of the crew: ${allowed.join(', ')}`;
  return {
    operationId: `${route.method}${path.replace(/[^A-Za-z]+(\w)?/g, (_, first: string = '') => first.toUpperCase())}`,
    summary: route.summary,
    description: `For ${who}.`,
    ...(allowed === 'anybody' ? {} : { security: [{ session: [] }] }),
    parameters: parametersOf(route, path),
    ...(route.body ? { requestBody: { required: true, content: bodyContent(route.body) } } : {}),
    responses: {
      [route.answer[0]]: { description: 'Done', ...answerContent(route.answer[1]) },
      default: {
        description: 'A problem (RFC 9457)',
        content: { 'application/problem+json': { schema: componentRef('Problem') } },
      },
    },
  };
}

function parametersOf(route: Route, path: string): object[] {
  const text = { type: 'string' };
  const inPath = [...path.matchAll(/\{(\w+)\}/g)].map(([, name]) => ({
    name,
    in: 'path',
    required: true,
    schema: text,
  }));
  const inHeader =
    route.method === 'put' || route.method === 'patch'
      ? [
          {
            name: 'If-Match',
            in: 'header',
            required: true,
            schema: text,
            description: 'The ETag that was changed',
          },
        ]
      : [];
  const paged = route.answer[1]?.endsWith('Page')
    ? [
        { name: 'limit', in: 'query', schema: { type: 'integer', minimum: 1, maximum: 200 } },
        { name: 'after', in: 'query', schema: text },
      ]
    : [];
  return [...inPath, ...inHeader, ...paged];
}

function bodyContent(body: NonNullable<Route['body']>): object {
  if (body !== 'upload') return { [JSON_TYPE]: { schema: componentRef(body) } };
  const properties = {
    frame: { type: 'integer', minimum: 0, default: 0 },
    picture: { type: 'string', contentMediaType: 'application/octet-stream' },
  };
  return { 'multipart/form-data': { schema: { type: 'object', required: ['picture'], properties } } };
}

function answerContent(what: string | undefined): object {
  if (what === undefined) return {};
  if (what.includes('/')) return { content: { [what]: {} } };
  return { content: { [JSON_TYPE]: { schema: componentRef(what) } } };
}

const componentRef = (name: string) => ({ $ref: `#/components/schemas/${name}` });

/** The definitions of all schema files in one place, their references turned there. */
function components(): object {
  const together = Object.assign({}, ...API_SCHEMAS.map(schema => schema.$defs)) as object;
  return JSON.parse(
    JSON.stringify(together).replace(/"[\w-]*(?:\.schema\.json)?#\/\$defs\//g, '"#/components/schemas/'),
  ) as object;
}

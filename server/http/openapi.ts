import * as z from 'zod/mini';
import { abilityFor, type Viewer } from '../contract/ability';
import type { Access, Endpoint } from '../contract/endpoint';
import { problems } from '../contract/problem';
import { grants, roles } from '../contract/words';

/** The interface in OpenAPI 3.1, made from the contract: every endpoint given, with who may call it. */
export function openApi(endpoints: readonly Endpoint[], baseUrl: string): object {
  const paths: Record<string, Record<string, object>> = {};
  for (const endpoint of endpoints) {
    const path = endpoint.path.replace(/:(\w+)/g, '{$1}');
    paths[path] = { ...paths[path], [endpoint.method]: operation(endpoint) };
  }
  return {
    openapi: '3.1.0',
    info: {
      title: 'Nilas',
      version: '1',
      description: 'Instants are milliseconds since 1970-01-01 UTC; days are local calendar days. Problems follow RFC 9457.',
    },
    servers: [{ url: baseUrl }],
    paths,
    components: {
      securitySchemes: {
        session: { type: 'apiKey', in: 'cookie', name: 'nilas.session' },
        telemetryKey: { type: 'http', scheme: 'bearer' },
      },
      schemas: { Problem: problemSchema },
    },
  };
}

function operation(endpoint: Endpoint): object {
  const { id, access, body, bodyType = 'application/json', params, query } = endpoint;
  return {
    operationId: id,
    tags: [id.split('.')[0]],
    'x-who-may-call': whoMay(access),
    security: access.kind === 'telemetry-key' ? [{ telemetryKey: [] }] : access.kind === 'public' || access.kind === 'dev' ? [] : [{ session: [] }],
    parameters: [...fields(params, 'path'), ...fields(query, 'query')],
    ...(body || endpoint.bodyType ? { requestBody: { required: true, content: { [bodyType]: { schema: body ? schemaOf(body, 'input') : {} } } } } : {}),
    responses: responses(endpoint),
  };
}

function whoMay(access: Access): string[] {
  if (access.kind === 'public') return [`anybody: ${access.reason}`];
  if (access.kind === 'person') return ['any signed-in person, about themselves'];
  if (access.kind === 'telemetry-key') return ['the holder of a telemetry key'];
  if (access.kind === 'dev') return ['anybody, in development and demo only'];
  return roles.filter((role) => abilityFor(sampleViewer(role)).can(access.action, access.subject));
}

const sampleViewer = (role: Viewer['role']): Viewer => ({
  personId: '',
  membershipId: 'sample',
  role,
  side: role === 'store-manager' ? 'store' : 'producer',
  storeIds: ['sample'],
  grants: [...grants],
});

function responses({ status, result, answer, problems: possible }: Endpoint): Record<string, object> {
  const success = status ?? (result || answer === 'file' ? 200 : 204);
  const content = result ? { content: { 'application/json': { schema: schemaOf(result, 'output') } } } : {};
  const answers: Record<string, object> = { [success]: { description: 'Done', ...content } };
  for (const type of possible) {
    const known = answers[problems[type]];
    const description = known && 'description' in known ? `${String(known.description)}, ${type}` : type;
    answers[problems[type]] = { description, content: { 'application/problem+json': { schema: { $ref: '#/components/schemas/Problem' } } } };
  }
  return answers;
}

interface ObjectSchema {
  properties?: Record<string, object>;
  required?: string[];
}

function fields(schema: Endpoint['params'], where: 'path' | 'query'): object[] {
  if (!schema) return [];
  const { properties = {}, required = [] } = schemaOf(schema, 'input') as ObjectSchema;
  return Object.entries(properties).map(([name, field]) => ({ name, in: where, required: required.includes(name), schema: field }));
}

function schemaOf(schema: z.ZodMiniType, io: 'input' | 'output'): object {
  const { $schema: _dialect, ...rest } = z.toJSONSchema(schema, { io, unrepresentable: 'any' });
  return rest;
}

const problemSchema = {
  type: 'object',
  required: ['type', 'title', 'detail', 'status'],
  properties: {
    type: { enum: Object.keys(problems).map((type) => `urn:nilas:problem:${type}`) },
    title: { type: 'string' },
    detail: { type: 'string' },
    status: { type: 'integer' },
    params: { type: 'object' },
    errors: {
      type: 'array',
      items: {
        type: 'object',
        properties: { pointer: { type: 'string' }, fault: { type: 'string' }, params: { type: 'object' } },
      },
    },
  },
};

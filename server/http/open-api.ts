import { z } from 'zod';
import * as bodies from '../../shared/contracts/bodies.ts';
import * as views from '../../shared/contracts/views.ts';
import { problemStatuses, type ProblemCode } from '../../shared/lib/problem.ts';
import type { Route } from './route.ts';

type Json = Readonly<Record<string, unknown>>;

/** Refusals that any call may meet. */
const everywhere: readonly ProblemCode[] = ['busy', 'unexpected'];
const everyWrite: readonly ProblemCode[] = ['cross-site', 'bad-request'];

/**
 * The OpenAPI 3.1 document of the calls, made from the schemas that the services parse with and the tests hold both
 * doors to.
 */
export function describeApi(routes: readonly Route[]): Json {
  const schemas = { ...namedSchemas(views, 'output'), ...namedSchemas(bodies, 'input'), Problem: problemSchema };
  const paths: Record<string, Record<string, Json>> = {
    '/healthz': {
      get: {
        operationId: 'health',
        summary: 'Whether the server and its store answer',
        responses: { 200: plain, 503: plain },
      },
    },
    '/api/openapi.json': {
      get: {
        operationId: 'description',
        summary: 'This document',
        responses: { 200: json('OpenAPI 3.1', { type: 'object' }) },
      },
    },
  };
  for (const route of routes) paths[route.path] = { ...paths[route.path], [route.method]: operation(route) };
  return {
    openapi: '3.1.0',
    info: {
      title: 'Earthstrap',
      version: '1',
      description:
        "A build club's book of donor motorcycles. Reads carry an `ETag`. Requests that change something must come from " +
        'the site itself: a program sends its address as `Origin`. Refusals are RFC 9457 problems.',
    },
    paths,
    components: {
      schemas,
      securitySchemes: { session: { type: 'apiKey', in: 'cookie', name: 'earthstrap' } },
    },
    security: [{}, { session: [] }],
  };
}

const plain = { description: 'In a word', content: { 'application/json': { schema: { type: 'object' } } } };

function json(description: string, schema: Json): Json {
  return { description, content: { 'application/json': { schema } } };
}

function operation(route: Route): Json {
  return {
    operationId: route.name,
    summary: route.summary,
    parameters: [
      ...parametersOf(route.parameters, 'path'),
      ...parametersOf(route.query, 'query'),
      ...(route.dependsOn === null ? [] : [ifMatch]),
    ],
    ...(route.body === null
      ? {}
      : {
          requestBody: { required: true, content: { 'application/json': { schema: referenceTo(bodies, route.body) } } },
        }),
    responses: responsesOf(route),
  };
}

const ifMatch = {
  name: 'If-Match',
  in: 'header',
  required: false,
  description: 'The `ETag` of what was read; answered 412 where it has changed since.',
  schema: { type: 'string' },
};

function responsesOf(route: Route): Json {
  const responses: Record<string, Json> = {
    [route.status]: route.view === null ? { description: 'Done' } : json(route.summary, referenceTo(views, route.view)),
  };
  if (route.method === 'get') responses['304'] = { description: 'As it was read (`If-None-Match`)' };
  const own = route.method === 'get' ? route.problems : [...route.problems, ...everyWrite];
  const codes = [...own, ...(route.body === null ? [] : (['too-large'] as const)), ...everywhere];
  for (const status of new Set(codes.map((code) => problemStatuses[code]))) {
    const named = new Set(codes.filter((code) => problemStatuses[code] === status));
    responses[status] = {
      description: [...named].join(', '),
      content: { 'application/problem+json': { schema: { $ref: '#/components/schemas/Problem' } } },
    };
  }
  return responses;
}

function parametersOf(schema: z.ZodObject, place: 'path' | 'query'): Json[] {
  const { properties = {}, required = [] } = z.toJSONSchema(schema, { io: 'input' });
  return Object.entries(properties).map(([name, property]) => ({
    name,
    in: place,
    required: place === 'path' || required.includes(name),
    schema: property,
  }));
}

/** `pageViewSchema` is named `PageView`. */
function nameOf(exported: string): string {
  return exported.charAt(0).toUpperCase() + exported.slice(1).replace(/Schema$/, '');
}

type Contracts = Readonly<Record<string, unknown>>;

function namedSchemas(contracts: Contracts, io: 'input' | 'output'): Json {
  const registry = z.registry<{ id: string }>();
  for (const [exported, schema] of Object.entries(contracts)) {
    if (schema instanceof z.ZodType) registry.add(schema, { id: nameOf(exported) });
  }
  const made = z.toJSONSchema(registry, { io, unrepresentable: 'any', uri: (id) => `#/components/schemas/${id}` });
  return Object.fromEntries(Object.entries(made.schemas).map(([name, schema]) => [name, withoutAddress(schema)]));
}

/** A schema stands in the document, so it needs no address of its own. */
function withoutAddress(schema: object): Json {
  return Object.fromEntries(Object.entries(schema).filter(([name]) => name !== '$schema' && name !== '$id'));
}

function referenceTo(contracts: Contracts, schema: z.ZodType): Json {
  const found = Object.entries(contracts).find(([, contract]) => contract === schema);
  if (found === undefined) throw new Error('A call gives or takes what the contracts do not name');
  return { $ref: `#/components/schemas/${nameOf(found[0])}` };
}

const text = { type: 'string' };

const problemSchema = {
  type: 'object',
  description: 'RFC 9457: what happened, what was kept, and what to do.',
  properties: {
    type: text,
    title: text,
    status: { type: 'integer' },
    detail: text,
    code: { type: 'string', enum: Object.keys(problemStatuses) },
    instance: text,
    fields: { type: 'object', additionalProperties: text },
    missing: {
      type: 'array',
      items: {
        type: 'object',
        properties: { code: text, address: { type: ['string', 'null'] }, message: text },
        required: ['code', 'address', 'message'],
      },
    },
    retryAfterSeconds: { type: 'integer' },
  },
  required: ['type', 'title', 'status', 'detail', 'code'],
};

import type { Router } from 'express';
import { describe, expect, test } from 'vitest';
import { z } from 'zod';
import { apiRoutes, createApiRouter } from '../../server/http/api-router.ts';
import { createSignIn } from '../../server/http/sign-in.ts';
import { openHttpClub } from '../factories/http-club.ts';

const response = z.object({
  description: z.string().min(1),
  content: z.record(z.string(), z.object({ schema: z.json() })).optional(),
});
const parameter = z.strictObject({
  name: z.string(),
  in: z.enum(['path', 'query', 'header']),
  required: z.boolean(),
  description: z.string().optional(),
  schema: z.record(z.string(), z.json()),
});
const operation = z.strictObject({
  operationId: z.string(),
  summary: z.string().min(1),
  parameters: z.array(parameter).default([]),
  requestBody: z
    .object({ required: z.literal(true), content: z.record(z.string(), z.object({ schema: z.json() })) })
    .optional(),
  responses: z.record(z.string().regex(/^[2-5]\d\d$/), response),
});
/** What OpenAPI 3.1 asks of the parts of a document that this one uses. */
const document = z.strictObject({
  openapi: z.literal('3.1.0'),
  info: z.object({ title: z.string(), version: z.string(), description: z.string() }),
  paths: z.record(
    z.string().startsWith('/'),
    z.record(z.enum(['get', 'post', 'put', 'delete']).or(z.string()), operation),
  ),
  components: z.object({
    schemas: z.record(z.string().regex(/^[\w.-]+$/), z.record(z.string(), z.json())),
    securitySchemes: z.json(),
  }),
  security: z.json(),
});

async function readDocument() {
  const club = await openHttpClub();
  const answer = await club.openBrowser()('/api/openapi.json');
  expect(answer.headers.get('content-type')).toBe('application/json; charset=utf-8');
  const written = await answer.json();
  return { club, written, read: document.parse(written) };
}

function* operationsOf(read: z.output<typeof document>) {
  for (const [path, methods] of Object.entries(read.paths)) {
    for (const [method, described] of Object.entries(methods)) yield { path, method, described };
  }
}

/** Every call that the Express router would answer, as the document writes it. */
function callsOf(router: Router): string[] {
  return router.stack.flatMap(({ route }) => {
    if (route === undefined) return [];
    const path = route.path.replaceAll(/:(\w+)/g, '{$1}');
    // What is left of a route's handlers refuses every other method.
    const methods = route.stack.map(({ method }) => method).filter((method) => method !== undefined);
    return methods.map((method) => `${method} ${path}`);
  });
}

describe('the OpenAPI document', () => {
  test('has every call of the router, and no other', async () => {
    const { club, read } = await readDocument();
    const { services, settings } = club.context;
    const signIn = createSignIn(services.members, { name: 'earthstrap', secure: false });
    const calls = callsOf(createApiRouter({ services, signIn, reading: settings.reading }));
    expect(calls.length).toBeGreaterThan(apiRoutes.length);
    const described = [...operationsOf(read)].map(({ path, method }) => `${method} ${path}`);
    expect(described.filter((call) => call !== 'get /healthz').sort()).toEqual(calls.sort());
  });

  test('names each call once', async () => {
    const { read } = await readDocument();
    const names = [...operationsOf(read)].map(({ described }) => described.operationId);
    expect(new Set(names).size).toBe(names.length);
  });

  test('describes every part of every path, and nothing that is not in it', async () => {
    const { read } = await readDocument();
    for (const { path, described } of operationsOf(read)) {
      const inPath = [...path.matchAll(/\{(\w+)\}/g)].map(([, name]) => name);
      const named = described.parameters.filter((one) => one.in === 'path');
      expect(
        named.map(({ name }) => name),
        path,
      ).toEqual(inPath);
      expect(
        named.every(({ required }) => required),
        path,
      ).toBe(true);
    }
  });

  test('points at nothing that it does not hold', async () => {
    const { written, read } = await readDocument();
    const pointers = [...JSON.stringify(written).matchAll(/"\$ref":"([^"]*)"/g)].map(([, pointer]) => pointer ?? '');
    expect(pointers.length).toBeGreaterThan(50);
    for (const pointer of new Set(pointers)) {
      expect(pointer).toMatch(/^#\/components\/schemas\//);
      expect(Object.keys(read.components.schemas)).toContain(pointer.slice('#/components/schemas/'.length));
    }
  });

  test('says of every call what it gives and how it refuses', async () => {
    const { read } = await readDocument();
    for (const { path, method, described } of operationsOf(read)) {
      const statuses = Object.keys(described.responses);
      expect(
        statuses.some((status) => status.startsWith('2')),
        path,
      ).toBe(true);
      if (!path.startsWith('/api/') || path === '/api/openapi.json') continue;
      expect(statuses, path).toContain('500');
      if (method !== 'get') expect(statuses, path).toContain('403');
      if (described.requestBody !== undefined) expect(statuses, path).toContain('413');
    }
  });

  test('is answered 304 to who has it', async () => {
    const club = await openHttpClub();
    const tag = (await club.openBrowser()('/api/openapi.json')).headers.get('etag') ?? '';
    expect((await club.openBrowser()('/api/openapi.json', { headers: { 'if-none-match': tag } })).status).toBe(304);
  });
});

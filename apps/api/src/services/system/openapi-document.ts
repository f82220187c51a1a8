import { problem, type Operation } from '@tipward/contract';
import { z } from 'zod';
import { ACCESS_COOKIE } from '../auth/session-cookies.ts';
import { APP_VERSION } from '../../version.ts';

type Json = Record<string, unknown>;

const schemaOf = (schema: z.ZodType, io: 'input' | 'output'): Json => {
  // Draft 2020-12 is what OpenAPI 3.1 uses; the dialect is stated once for the document.
  const { $schema: _dialect, ...rest } = z.toJSONSchema(schema, {
    io,
    unrepresentable: 'any',
    reused: 'inline',
  });
  return rest;
};

function fieldsOf(schema: z.ZodType | null, place: 'path' | 'query'): Json[] {
  if (schema === null) return [];
  const { properties = {}, required = [] } = schemaOf(schema, 'input') as {
    properties?: Record<string, Json>;
    required?: string[];
  };
  return Object.entries(properties).map(([name, field]) => ({
    name,
    in: place,
    required: place === 'path' || required.includes(name),
    schema: field,
  }));
}

function headersOf(operation: Operation): Json[] {
  const header = (name: string, required: boolean, description: string): Json => ({
    name,
    in: 'header',
    required,
    description,
    schema: { type: 'string' },
  });
  return [
    ...(operation.method !== 'get' && operation.access !== 'public'
      ? [header('X-CSRF-Token', true, 'The csrfToken of the session')]
      : []),
    ...(operation.ifMatch === true ? [header('If-Match', true, 'ETag of the state that is edited')] : []),
    ...(operation.idempotent === true
      ? [header('Idempotency-Key', false, 'The same key and body get the same answer for 24 hours')]
      : []),
  ];
}

function answersOf(operation: Operation): Json {
  const content =
    operation.binary !== undefined
      ? { [operation.binary]: { schema: { type: 'string', contentMediaType: operation.binary } } }
      : operation.response === null
        ? undefined
        : { 'application/json': { schema: schemaOf(operation.response, 'output') } };
  return {
    [operation.status]: { description: operation.summary, ...(content === undefined ? {} : { content }) },
    default: {
      description: 'A refusal, as problem details (RFC 9457)',
      content: { 'application/problem+json': { schema: { $ref: '#/components/schemas/Problem' } } },
    },
  };
}

function describe(operation: Operation): Json {
  return {
    operationId: operation.id,
    tags: [operation.id.split('.')[0]],
    summary: operation.summary,
    ...(operation.access === 'public' ? { security: [] } : {}),
    parameters: [
      ...fieldsOf(operation.params, 'path'),
      ...fieldsOf(operation.query, 'query'),
      ...headersOf(operation),
    ],
    ...(operation.body === null
      ? {}
      : {
          requestBody: {
            required: true,
            content: { 'application/json': { schema: schemaOf(operation.body, 'input') } },
          },
        }),
    responses: answersOf(operation),
  };
}

/** The interface as an OpenAPI 3.1 document, made from the operations of the contract. */
export function openapiDocument(operations: readonly Operation[]): Json {
  const paths: Record<string, Json> = {};
  for (const operation of operations) {
    const path = operation.path.replaceAll(/:(\w+)/gu, '{$1}');
    paths[path] = { ...paths[path], [operation.method]: describe(operation) };
  }
  return {
    openapi: '3.1.0',
    info: { title: 'Tipward', version: APP_VERSION },
    servers: [{ url: '/api/v1' }],
    security: [{ session: [] }],
    paths,
    components: {
      schemas: { Problem: schemaOf(problem, 'output') },
      securitySchemes: { session: { type: 'apiKey', in: 'cookie', name: ACCESS_COOKIE } },
    },
  };
}

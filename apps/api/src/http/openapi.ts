import type { RouteContract } from '@ligament/domain/contract/route';
import { problem } from '@ligament/domain/contract/primitives';
import * as z from 'zod';

type Schema = Record<string, unknown>;

const jsonSchema = (schema: z.ZodType, io: 'input' | 'output'): Schema => {
  const { $schema: _dialect, ...rest } = z.toJSONSchema(schema, { io, unrepresentable: 'any' });
  return rest;
};

/** OpenAPI 3.1 document of the routes as they are served, made from the same contracts. */
export function openApiDocument(contracts: readonly RouteContract[], publicUrl: string) {
  const paths: Record<string, Record<string, unknown>> = {};
  for (const contract of contracts) {
    const path = contract.path.replaceAll(/:(\w+)/g, '{$1}');
    (paths[path] ??= {})[contract.method] = operation(contract);
  }
  return {
    openapi: '3.1.0',
    info: {
      title: 'Ligament',
      version: '1',
      description: 'Flaws of pressure equipment, from the inspection file to the signed decision.',
    },
    servers: [{ url: publicUrl }],
    paths,
    components: {
      schemas: { Problem: jsonSchema(problem, 'output') },
      securitySchemes: { session: { type: 'apiKey', in: 'cookie', name: '__Host-ligament' } },
    },
  };
}

function operation(contract: RouteContract) {
  const success =
    contract.status === 204
      ? { description: 'Done' }
      : {
          description: 'Done',
          content: { 'application/json': { schema: jsonSchema(contract.response, 'output') } },
        };
  return {
    summary: contract.summary,
    security: contract.access === 'public' ? [] : [{ session: [] }],
    'x-access': contract.access,
    parameters: [
      ...parameters(contract.params, 'path'),
      ...parameters(contract.query, 'query'),
      ...(contract.versioned
        ? [{ name: 'If-Match', in: 'header', required: true, schema: { type: 'string' } }]
        : []),
    ],
    ...requestBody(contract),
    responses: {
      [contract.status]: success,
      default: {
        description: 'Problem details (RFC 9457)',
        content: {
          'application/problem+json': { schema: { $ref: '#/components/schemas/Problem' } },
        },
      },
    },
  };
}

function parameters(schema: z.ZodType, place: 'path' | 'query') {
  const { properties = {}, required = [] } = jsonSchema(schema, 'input') as {
    properties?: Record<string, Schema>;
    required?: string[];
  };
  return Object.entries(properties).map(([name, each]) => ({
    name,
    in: place,
    required: place === 'path' || required.includes(name),
    schema: each,
  }));
}

function requestBody(contract: RouteContract) {
  if (contract.upload) {
    const file = {
      type: 'object',
      properties: { file: { type: 'string', format: 'binary' } },
      required: ['file'],
    };
    return {
      requestBody: { required: true, content: { 'multipart/form-data': { schema: file } } },
    };
  }
  if (contract.method === 'get' || contract.method === 'delete') return {};
  return {
    requestBody: {
      required: true,
      content: { 'application/json': { schema: jsonSchema(contract.body, 'input') } },
    },
  };
}

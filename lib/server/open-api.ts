import 'server-only';
import { z } from 'zod';
import { type Endpoint, anyJson, none, nothing } from '@/lib/contracts/endpoint';
import { ENDPOINTS, type EndpointName } from '@/lib/contracts/endpoints';
import { PROBLEM_JSON, problemDetails } from '@/lib/contracts/problem-details';
import { sessionCookieName } from './auth/session-cookie';

const JOB_SCHEMA = { $ref: '/api/job-schema.json' };

/** OpenAPI 3.1 of every endpoint in the contract; made from the schemas that check requests and answers. */
export function openApi(): object {
  const paths: Record<string, Record<string, object>> = {};
  for (const [name, endpoint] of Object.entries(ENDPOINTS) as [EndpointName, Endpoint][]) {
    const methods = (paths[endpoint.path] ??= {});
    methods[endpoint.method.toLowerCase()] = operation(name, endpoint);
  }
  return {
    openapi: '3.1.0',
    info: { title: 'Spindleaf', version: '1' },
    paths,
    components: {
      schemas: { Problem: jsonSchema(problemDetails, 'output') },
      securitySchemes: { session: { type: 'apiKey', in: 'cookie', name: sessionCookieName() } },
    },
  };
}

function operation(name: EndpointName, endpoint: Endpoint): object {
  return {
    operationId: name,
    summary: endpoint.summary,
    'x-access': endpoint.access,
    security: endpoint.access.kind === 'public' ? [] : [{ session: [] }],
    parameters: [...parameters(endpoint.params, 'path'), ...parameters(endpoint.query, 'query')],
    ...(endpoint.body !== nothing && { requestBody: requestBody(name, endpoint) }),
    responses: {
      [endpoint.status]: answer(endpoint),
      default: {
        description: 'An error',
        content: { [PROBLEM_JSON]: { schema: { $ref: '#/components/schemas/Problem' } } },
      },
    },
  };
}

function requestBody(name: EndpointName, endpoint: Endpoint): object {
  const schema = name === 'saveJob' ? JOB_SCHEMA : jsonSchema(endpoint.body, 'input');
  return { required: true, content: { 'application/json': { schema } } };
}

function answer({ answer: schema, mediaType, status }: Endpoint): object {
  if (status === 204) return { description: 'Done' };
  const content = schema === nothing || schema === anyJson ? {} : { schema: jsonSchema(schema, 'output') };
  return { description: 'Done', content: { [mediaType]: content } };
}

function parameters(schema: z.ZodType, where: 'path' | 'query'): object[] {
  if (schema === none || !(schema instanceof z.ZodObject)) return [];
  const { properties = {}, required = [] } = jsonSchema(schema, 'input') as {
    properties?: Record<string, object>;
    required?: string[];
  };
  return Object.entries(properties).map(([name, property]) => ({
    name,
    in: where,
    required: where === 'path' || required.includes(name),
    schema: property,
  }));
}

function jsonSchema(schema: z.ZodType, io: 'input' | 'output'): object {
  const { $schema: _, ...rest } = z.toJSONSchema(schema, { io, unrepresentable: 'any' });
  return rest;
}

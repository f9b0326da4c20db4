import { z } from 'zod';
import { problemSchema } from '@shared/contracts/common.ts';
import { problemCatalogue } from './problems.ts';
import type { RouteDeclaration } from './route.ts';

type Json = Record<string, unknown>;

const schemaOf = (schema: z.ZodType, io: 'input' | 'output'): Json => {
  const { $schema: _dialect, ...rest } = z.toJSONSchema(schema, { io, unrepresentable: 'any' }) as Json;
  return rest;
};

/** `/api/people/:id` is written `/api/people/{id}` there. */
const templateOf = (path: string): string => path.replace(/:(\w+)/g, '{$1}');

function parametersOf(declared: RouteDeclaration): Json[] {
  const of = (schema: z.ZodType | undefined, place: 'path' | 'query'): Json[] => {
    if (!schema) return [];
    const { properties = {}, required = [] } = schemaOf(schema, 'input') as {
      properties?: Record<string, Json>;
      required?: string[];
    };
    return Object.entries(properties).map(([name, one]) => ({
      name,
      in: place,
      required: place === 'path' || required.includes(name),
      schema: one,
    }));
  };
  const version = { name: 'If-Match', in: 'header', required: true, schema: { type: 'string' } };
  return [
    ...of(declared.params, 'path'),
    ...of(declared.query, 'query'),
    ...(declared.ifMatch ? [version] : []),
  ];
}

function answersOf({ response, status, summary }: RouteDeclaration): Json {
  const content =
    response === 'empty' || response === 'stream'
      ? {}
      : { content: { 'application/json': { schema: schemaOf(response, 'output') } } };
  return {
    [status]: { description: summary, ...content },
    default: { $ref: '#/components/responses/Problem' },
  };
}

function operationOf(declared: RouteDeclaration): Json {
  const { who, feature, summary, body } = declared;
  const roles = typeof who === 'string' ? who : who.join(', ');
  return {
    tags: [feature],
    summary,
    description: `Who may: ${roles}.`,
    ...(who === 'public' ? {} : { security: [{ session: [] }] }),
    parameters: parametersOf(declared),
    ...(body
      ? {
          requestBody: {
            required: true,
            content: { 'application/json': { schema: schemaOf(body, 'input') } },
          },
        }
      : {}),
    responses: answersOf(declared),
  };
}

/** The OpenAPI 3.1 document of the routes, made from the same schemas that check each request. */
export function describeRoutes(routes: readonly RouteDeclaration[]): Json {
  const paths: Record<string, Json> = {};
  for (const declared of routes) {
    const path = templateOf(declared.path);
    paths[path] = { ...paths[path], [declared.method]: operationOf(declared) };
  }
  const problems = Object.entries(problemCatalogue).map(
    ([code, { status, title }]) => `${code} (${status}): ${title}`,
  );
  return {
    openapi: '3.1.0',
    info: {
      title: 'Backmark',
      version: '1',
      description: 'Standard connection details of a steel-design firm.',
    },
    paths,
    components: {
      securitySchemes: { session: { type: 'apiKey', in: 'cookie', name: 'backmark_access' } },
      responses: {
        Problem: {
          description: problems.join('\n'),
          content: { 'application/problem+json': { schema: schemaOf(problemSchema, 'output') } },
        },
      },
    },
  };
}

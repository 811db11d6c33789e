import {
  OpenAPIRegistry,
  OpenApiGeneratorV31,
  extendZodWithOpenApi,
  type RouteConfig,
} from '@asteasolutions/zod-to-openapi';
import { api, problemBody, type EndpointSpec } from '@lydite/contracts';
import { Router } from 'express';
import { z } from 'zod';

extendZodWithOpenApi(z);

const upload = z.object({ photo: z.string().meta({ format: 'binary' }), slot: z.string().optional() });

function requestOf(spec: EndpointSpec): RouteConfig['request'] {
  const body =
    spec.consumes === 'multipart'
      ? { content: { 'multipart/form-data': { schema: upload } } }
      : spec.body && !(spec.body instanceof z.ZodUndefined)
        ? { content: { 'application/json': { schema: spec.body } }, required: true }
        : undefined;
  return {
    ...(spec.params ? { params: spec.params as z.ZodObject } : {}),
    ...(spec.query ? { query: spec.query as z.ZodObject } : {}),
    ...(body ? { body } : {}),
  };
}

function responsesOf(spec: EndpointSpec): RouteConfig['responses'] {
  const status = spec.status ?? (spec.response === 'none' ? 204 : 200);
  const content =
    spec.response === 'none'
      ? {}
      : spec.response === 'file'
        ? { content: { 'application/octet-stream': { schema: z.string().meta({ format: 'binary' }) } } }
        : { content: { 'application/json': { schema: spec.response } } };
  return {
    [status]: { description: 'Done', ...content },
    default: { description: 'Refused', content: { 'application/problem+json': { schema: problemBody } } },
  };
}

const accessInWords = ({ access, fresh }: EndpointSpec): string => {
  const who =
    access === 'public' ? 'Anybody.' : access === 'signed-in' ? 'Anybody signed in.' : `Role ${access.join(' or ')}.`;
  return fresh ? `${who} Wants the password entered within the last ten minutes.` : who;
};

/** The OpenAPI 3.1 document, generated from the contracts. */
export function openApiDocument(publicUrl: string): object {
  const registry = new OpenAPIRegistry();
  for (const [route, spec] of Object.entries(api) as [string, EndpointSpec][]) {
    const [method, path] = route.split(' ') as [string, string];
    registry.registerPath({
      method: method.toLowerCase() as 'get',
      path: path.replaceAll(/:(\w+)/g, '{$1}'),
      operationId: route.replaceAll(/[^A-Za-z]+/g, '_'),
      summary: spec.summary,
      description: accessInWords(spec),
      tags: [path.split('/')[1] === 'my' ? path.split('/')[2]! : path.split('/')[1]!],
      ...(requestOf(spec) ? { request: requestOf(spec) } : {}),
      responses: responsesOf(spec),
    });
  }
  return new OpenApiGeneratorV31(registry.definitions).generateDocument({
    openapi: '3.1.0',
    info: { title: 'Lydite', version: '1', description: 'Buy, sell and settle scrap lots by the gold they hold.' },
    servers: [{ url: `${publicUrl}/api` }],
  });
}

export function openApiRoute(publicUrl: string): Router {
  const document = openApiDocument(publicUrl);
  return Router().get('/openapi.json', (_req, res) => void res.json(document));
}

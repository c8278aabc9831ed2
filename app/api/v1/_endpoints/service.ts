import { z } from 'zod';
import { healthSchema, readinessSchema } from '../_contracts/health';
import { defineEndpoint } from './Endpoint';

export const readHealthEndpoint = defineEndpoint({
  method: 'get',
  path: '/health',
  operationId: 'readHealth',
  summary: 'Whether the process answers',
  tag: 'service',
  access: 'public',
  answers: { 200: { description: 'It does.', schema: healthSchema } },
  problems: [],
});

export const readReadinessEndpoint = defineEndpoint({
  method: 'get',
  path: '/ready',
  operationId: 'readReadiness',
  summary: 'Whether the process can do its work: the database answers and has every migration',
  tag: 'service',
  access: 'public',
  answers: { 200: { description: 'It can.', schema: readinessSchema } },
  problems: ['not-ready'],
});

export const readOpenApiEndpoint = defineEndpoint({
  method: 'get',
  path: '/openapi.json',
  operationId: 'readOpenApi',
  summary: 'This description (OpenAPI 3.1)',
  tag: 'service',
  access: 'public',
  answers: { 200: { description: 'The description.', schema: z.looseObject({ openapi: z.string() }) } },
  problems: [],
});

export const readConformanceKitEndpoint = defineEndpoint({
  method: 'get',
  path: '/conformance-kit',
  operationId: 'readConformanceKit',
  summary:
    'The conformance kit for people who write adapters, as a ZIP archive; it holds nothing of any show',
  tag: 'service',
  access: 'public',
  answers: {
    200: {
      description: 'The archive, as a download.',
      mediaType: 'application/zip',
      headers: { ETag: 'SHA-256 of what is in it.', 'Content-Disposition': 'Name of the archive.' },
    },
  },
  problems: [],
});

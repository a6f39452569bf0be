import { OpenAPIRegistry, OpenApiGeneratorV31 } from '@asteasolutions/zod-to-openapi';
import { BUILD_CALLS } from './build-calls';
import { describeCall } from './describe-call';
import { DROP_CALLS } from './drop-calls';
import { JUDGING_CALLS } from './judging-calls';
import { LIMIT_CALLS } from './limit-calls';
import { PRODUCT_CALLS } from './product-calls';
import { SWEEP_CALLS } from './sweep-calls';

const CALLS = [...SWEEP_CALLS, ...PRODUCT_CALLS, ...BUILD_CALLS, ...JUDGING_CALLS, ...DROP_CALLS, ...LIMIT_CALLS];

const DESCRIPTION = `For benches and build pipelines. Times are ISO 8601 in UTC, frequencies Hz, levels dBuV, margins dB, unrounded.
Errors are problem details (RFC 9457) with a stable \`type\`. Results are pre-compliance, never a certificate.`;

type Document = ReturnType<OpenApiGeneratorV31['generateDocument']>;

/** The OpenAPI 3.1 document of the interface, made from the contracts the server checks requests by. */
export function buildDocument(): Document {
  const registry = new OpenAPIRegistry();
  registry.registerComponent('securitySchemes', 'token', {
    type: 'http',
    scheme: 'bearer',
    description: 'A team token, made on the page Tokens: `Authorization: Bearer strand_...`',
  });
  registry.registerComponent('securitySchemes', 'session', {
    type: 'apiKey',
    in: 'cookie',
    name: 'strandline',
    description: 'The session of the web pages',
  });
  registry.registerComponent('securitySchemes', 'crossSite', {
    type: 'apiKey',
    in: 'header',
    name: 'X-XSRF-TOKEN',
    description: 'The value of the cookie XSRF-TOKEN; goes with the session in every call that changes something',
  });
  for (const call of CALLS) registry.registerPath(describeCall(call));
  return withoutNullParameters(
    new OpenApiGeneratorV31(registry.definitions).generateDocument({
      openapi: '3.1.0',
      info: { title: 'Strandline, the bench and pipeline interface', version: '1', description: DESCRIPTION },
      servers: [{ url: '/' }],
    }),
  );
}

/** Numbers in an address are coerced from text, which the generator takes for a leave to send null. */
function withoutNullParameters(document: Document): Document {
  return JSON.parse(JSON.stringify(document), (_name, value: unknown) => {
    if (!isNullableParameter(value)) return value;
    const [type] = value.schema.type.filter((one) => one !== 'null');
    return { ...value, schema: { ...value.schema, type } };
  }) as Document;
}

function isNullableParameter(value: unknown): value is { schema: { type: string[] } } {
  if (typeof value !== 'object' || value === null || !('in' in value) || !('schema' in value)) return false;
  const { schema } = value;
  return typeof schema === 'object' && schema !== null && 'type' in schema && Array.isArray(schema.type);
}

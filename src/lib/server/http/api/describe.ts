import { z } from 'zod';
import { apiOperations, type ApiOperation } from './operations';

const ulid = { type: 'string', pattern: '^[0-7][0-9A-HJKMNP-TV-Z]{25}$' };
const problem = {
	description: 'Problem details (RFC 9457)',
	content: { 'application/problem+json': { schema: { $ref: '#/components/schemas/Problem' } } }
};

/** OpenAPI 3.1, made from the schemas that the use cases themselves parse with. */
export function describeApi(origin: string) {
	const paths: Record<string, Record<string, unknown>> = {};
	for (const one of apiOperations) (paths[one.path] ??= {})[one.method] = describe(one);
	(paths['/api/v1/schools/{school}/submissions/{submission}/photographs'] ??= {}).post = upload;
	return {
		openapi: '3.1.0',
		info: {
			title: 'Ringland',
			version: '1',
			description:
				'Writes carry a ULID made by the caller: the same key with the same body gives the same answer and is done once. A browser is known by its cookie and must come from the own origin; a school’s script by a bearer token with scopes.'
		},
		servers: [{ url: origin }],
		components: {
			securitySchemes: {
				session: { type: 'apiKey', in: 'cookie', name: 'authjs.session-token' },
				script: { type: 'http', scheme: 'bearer' }
			},
			schemas: {
				Problem: {
					type: 'object',
					required: ['type', 'title', 'status', 'detail'],
					properties: {
						type: { type: 'string', format: 'uri' },
						title: { type: 'string' },
						status: { type: 'integer' },
						detail: { type: 'string' },
						fields: { type: 'object' }
					}
				}
			}
		},
		paths
	};
}

function describe({ method, path, summary, useCase, inPath, scope }: ApiOperation) {
	const input = z.toJSONSchema(useCase.input, { io: 'input', unrepresentable: 'any' }) as {
		properties?: Record<string, unknown>;
		required?: string[];
	};
	const said = new Set(Object.values(inPath));
	const properties = Object.fromEntries(
		Object.entries(input.properties ?? {}).filter(([name]) => !said.has(name))
	);
	const required = (input.required ?? []).filter((name) => !said.has(name));
	const body = {
		required: true,
		content: {
			'application/json': {
				schema: {
					type: 'object',
					properties: { requestKey: ulid, ...properties },
					required: ['requestKey', ...required]
				}
			}
		}
	};
	return {
		operationId: useCase.name,
		summary,
		security: scope === null ? [{ session: [] }] : [{ session: [] }, { script: [scope] }],
		parameters: [...path.matchAll(/\{(\w+)\}/g)].map(([, name]) => ({
			name,
			in: 'path',
			required: true,
			schema: { type: 'string' }
		})),
		...(method === 'get' ? {} : { requestBody: body }),
		responses: { 200: { description: 'Done' }, default: problem }
	};
}

const upload = {
	operationId: 'add-photograph',
	summary: 'Add a photograph: the body is the file itself, at most 25 MB',
	security: [{ session: [] }],
	parameters: [
		...['school', 'submission'].map((name) => ({
			name,
			in: 'path',
			required: true,
			schema: { type: 'string' }
		})),
		{ name: 'shot', in: 'query', required: true, schema: { type: 'string' } },
		{ name: 'requestKey', in: 'query', required: true, schema: ulid }
	],
	requestBody: {
		required: true,
		content: Object.fromEntries(
			['image/jpeg', 'image/png', 'image/webp', 'image/avif'].map((type) => [type, {}])
		)
	},
	responses: { 201: { description: 'Taken in' }, default: problem }
};

import { ulid } from '$lib/domain/ids';

/** What a call to the API came to. A network that is gone is no error: the caller waits and repeats. */
export type Answer<T> =
	| { kind: 'done'; value: T }
	| {
			kind: 'problem';
			status: number;
			detail: string;
			fields: Record<string, string[]>;
			conflict?: unknown;
	  }
	| { kind: 'offline' }
	| { kind: 'signed-out' };

export function newRequestKey(): string {
	return ulid(Date.now(), crypto.getRandomValues(new Uint8Array(10)));
}

/** Sends one write. The key is the caller's, so that a repeated send is the same request. */
export async function write<T>(
	path: string,
	body: Record<string, unknown> & { requestKey: string },
	method: 'POST' | 'DELETE' = 'POST'
): Promise<Answer<T>> {
	return send<T>(path, {
		method,
		headers: { 'content-type': 'application/json' },
		body: JSON.stringify(body)
	});
}

/** Sends a file as the body itself. */
export function upload<T>(path: string, file: Blob): Promise<Answer<T>> {
	return send<T>(path, { method: 'POST', headers: { 'content-type': file.type }, body: file });
}

export function read<T>(path: string): Promise<Answer<T>> {
	return send<T>(path, { method: 'GET' });
}

async function send<T>(path: string, request: RequestInit): Promise<Answer<T>> {
	let response: Response;
	try {
		response = await fetch(path, { ...request, credentials: 'same-origin' });
	} catch {
		return { kind: 'offline' };
	}
	if (response.ok) return { kind: 'done', value: (await response.json()) as T };
	if (response.status === 401) return { kind: 'signed-out' };
	// A proxy that cannot reach the server: as good as no network.
	if ([502, 503, 504].includes(response.status)) return { kind: 'offline' };
	const problem = (await response.json().catch(() => ({}))) as {
		detail?: string;
		fields?: Record<string, string[]>;
		conflict?: unknown;
	};
	return {
		kind: 'problem',
		status: response.status,
		detail: problem.detail ?? `The server answered ${response.status}.`,
		fields: problem.fields ?? {},
		conflict: problem.conflict
	};
}

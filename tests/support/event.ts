import type { Cookies, RequestEvent } from '@sveltejs/kit';
import { localsHandle } from '$lib/server/http/handles/locals';
import type { TestHouse } from './house';

export type Jar = Map<string, string>;
export type Asked = {
	method?: string;
	headers?: Record<string, string>;
	body?: BodyInit | null;
	params?: Record<string, string>;
	route?: string;
	address?: string;
	jar?: Jar;
};

/** A request as kit would hand it to a route, with a cookie jar like a browser's. */
export async function makeEvent(
	house: TestHouse,
	path: string,
	{ method = 'GET', headers, body, params = {}, route = path, address, jar = new Map() }: Asked = {}
): Promise<RequestEvent> {
	const url = new URL(path, house.config.ORIGIN);
	const cookie = [...jar].map(([name, value]) => `${name}=${value}`).join('; ');
	const init: RequestInit & { duplex: 'half' } = {
		method,
		headers: { host: url.host, ...(cookie ? { cookie } : {}), ...headers },
		body,
		duplex: 'half'
	};
	const event = {
		url,
		request: new Request(url, init),
		params,
		route: { id: route },
		locals: {},
		cookies: cookiesOf(jar, house),
		getClientAddress: () => address ?? '192.0.2.1',
		setHeaders: () => undefined
	} as unknown as RequestEvent;
	await localsHandle(() => house)({ event, resolve: () => new Response() });
	return event;
}

function cookiesOf(jar: Jar, house: TestHouse): Cookies {
	return {
		get: (name) => jar.get(name),
		getAll: () => [...jar].map(([name, value]) => ({ name, value })),
		set: (name, value, { expires, maxAge }) => {
			const ended = maxAge === 0 || (expires && expires.getTime() <= house.now().getTime());
			if (ended || value === '') jar.delete(name);
			else jar.set(name, value);
		},
		delete: (name) => void jar.delete(name),
		serialize: (name, value) => `${name}=${value}`
	};
}

/** What a thrown redirect or error of kit says. */
export async function thrown(work: Promise<unknown>): Promise<Record<string, unknown>> {
	return work.then(
		() => ({ status: 'nothing was thrown' }),
		(one: Record<string, unknown>) => one
	);
}

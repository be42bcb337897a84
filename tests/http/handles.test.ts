import { afterEach, beforeEach, describe, expect, it } from 'vitest';
import type { Handle, RequestEvent } from '@sveltejs/kit';
import { bodyBytesAtMost, bodyLimitHandle } from '$lib/server/http/handles/body-limit';
import { ownHostHandle } from '$lib/server/http/handles/own-host';
import { securityHeadersHandle } from '$lib/server/http/handles/security-headers';
import { uploadRoutes } from '$lib/server/http/upload-routes';
import { makeEvent, type Asked } from '../support/event';
import { makeHouse, type TestHouse } from '../support/house';

let house: TestHouse;
beforeEach(async () => {
	house = await makeHouse();
});
afterEach(() => house.close());

async function through(
	handle: Handle,
	path: string,
	asked: Asked = {},
	answer: (event: RequestEvent) => Response | Promise<Response> = () => new Response('the page')
) {
	return handle({ event: await makeEvent(house, path, asked), resolve: answer });
}

describe('a request under another host', () => {
	const own = () => ownHostHandle(() => house);

	it('is sent to the own one, its path and query kept', async () => {
		const asked = { headers: { host: 'localhost:4180' } };
		const answer = await through(own(), '/s/averholm/bench?week=2', asked);
		expect(answer.status).toBe(307);
		expect(answer.headers.get('location')).toBe('http://127.0.0.1:4180/s/averholm/bench?week=2');
	});

	it('that writes is refused, since its body would be lost', async () => {
		const asked = { method: 'POST', body: 'x', headers: { host: 'elsewhere.example' } };
		expect((await through(own(), '/sign-in', asked)).status).toBe(421);
	});

	it.each([
		['/bench', '127.0.0.1:4180'],
		['/healthz', '10.0.0.3:4180'],
		['/readyz', '10.0.0.3:4180']
	])('is not %s under %s', async (path, host) => {
		expect(await (await through(own(), path, { headers: { host } })).text()).toBe('the page');
	});

	it('is judged by what the proxy was asked for, where one is configured', async () => {
		const headers = { host: 'inside:4180', 'x-forwarded-host': '127.0.0.1:4180' };
		expect((await through(own(), '/bench', { headers })).status).toBe(307);
		await house.close();
		house = await makeHouse({ environment: { ADDRESS_HEADER: 'x-forwarded-for' } });
		expect((await through(own(), '/bench', { headers })).status).toBe(200);
	});
});

describe('a body', () => {
	const read = async (event: RequestEvent) =>
		new Response(String((await event.request.arrayBuffer()).byteLength));
	const post = (bytes: number, more: Asked = {}) =>
		through(
			bodyLimitHandle,
			'/anything',
			{ method: 'POST', body: new Uint8Array(bytes), ...more },
			read
		);
	function dripping(bytes: number) {
		let left = bytes;
		return new ReadableStream<Uint8Array>({
			pull(controller) {
				const chunk = Math.min(left, 64 * 1024);
				if (chunk === 0) controller.close();
				else controller.enqueue(new Uint8Array(chunk));
				left -= chunk;
			}
		});
	}

	it('up to the limit arrives whole', async () => {
		expect(await (await post(bodyBytesAtMost)).text()).toBe(String(bodyBytesAtMost));
	});

	it('that says it is larger is refused before it is read', async () => {
		const headers = { 'content-length': String(bodyBytesAtMost + 1) };
		expect((await post(10, { headers })).status).toBe(413);
		const asked = { method: 'POST', body: 'x', headers };
		const told = await through(bodyLimitHandle, '/api/v1/anything', asked, read);
		expect(told.headers.get('content-type')).toBe('application/problem+json');
	});

	it('that says nothing, or too little, is stopped while it is read', async () => {
		const long = () => dripping(bodyBytesAtMost + 1);
		await expect(post(0, { body: long() })).rejects.toMatchObject({ status: 413 });
		const headers = { 'content-length': '10' };
		await expect(post(0, { body: long(), headers })).rejects.toMatchObject({ status: 413 });
	});

	it('of an upload route streams past the limit', async () => {
		for (const route of uploadRoutes) {
			const answer = await post(0, { body: dripping(3 * bodyBytesAtMost), route });
			expect(await answer.text()).toBe(String(3 * bodyBytesAtMost));
		}
	});
});

describe('headers', () => {
	const headers = () => securityHeadersHandle(() => house);

	it('let forms lead to this site and to the till, and nowhere else', async () => {
		const policy = "default-src 'self'; script-src 'self' 'nonce-x'";
		const page = () =>
			new Response('', {
				headers: { 'content-type': 'text/html', 'content-security-policy': policy }
			});
		const answer = await through(headers(), '/', {}, page);
		expect(answer.headers.get('content-security-policy')).toBe(
			`${policy}; form-action 'self' https://checkout.stripe.com`
		);
	});

	it('let an answer that is no page run nothing', async () => {
		const answer = await through(headers(), '/api/v1/x', {}, () => Response.json({}));
		expect(answer.headers.get('content-security-policy')).toContain("default-src 'none'");
		expect(answer.headers.get('x-content-type-options')).toBe('nosniff');
		expect(answer.headers.has('strict-transport-security')).toBe(false);
	});

	it('keep what is somebody’s own out of caches, and leave what a route said', async () => {
		const cache = async (path: string, said?: string) =>
			(
				await through(
					headers(),
					path,
					{},
					() => new Response('', said ? { headers: { 'cache-control': said } } : {})
				)
			).headers.get('cache-control');
		expect(await cache('/s/averholm/bench')).toBe('private, no-store');
		expect(await cache('/account')).toBe('private, no-store');
		expect(await cache('/sign-in/link/secret')).toBe('private, no-store');
		expect(await cache('/prospectus')).toBeNull();
		expect(await cache('/s/averholm/files/x', 'private, max-age=60')).toBe('private, max-age=60');
	});

	it('ask for TLS once it is there', async () => {
		await house.close();
		house = await makeHouse({ environment: { ORIGIN: 'https://ringland.school.example' } });
		const answer = await through(headers(), '/');
		expect(answer.headers.get('strict-transport-security')).toMatch(/max-age=\d{8}/);
	});
});

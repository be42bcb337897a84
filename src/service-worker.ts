/// <reference no-default-lib="true"/>
/// <reference lib="esnext" />
/// <reference lib="webworker" />
import { version } from '$service-worker';

/**
 * Keeps the tool crib at hand where there is no network. It is registered by the crib's own pages
 * and for them alone (scope `/crib`): no page of a school, no answer of the API and nothing that
 * says who is signed in ever lies in its cache. Pages are fetched without credentials.
 */
const worker = self as unknown as ServiceWorkerGlobalScope;
const cacheName = `crib-${version}`;
const index = '/crib';

worker.addEventListener('install', (event) => {
	event.waitUntil(
		keepCrib().then(
			() => worker.skipWaiting(),
			// Half a crib is none: the browser tries again at the next visit.
			async (error: unknown) => {
				await caches.delete(cacheName);
				throw error;
			}
		)
	);
});

worker.addEventListener('activate', (event) => {
	event.waitUntil(
		(async () => {
			const old = (await caches.keys()).filter(
				(name) => name.startsWith('crib-') && name !== cacheName
			);
			await Promise.all(old.map((name) => caches.delete(name)));
			await worker.clients.claim();
		})()
	);
});

worker.addEventListener('fetch', (event) => {
	const { request } = event;
	const url = new URL(request.url);
	if (request.method !== 'GET' || url.origin !== worker.location.origin) return;
	if (request.mode === 'navigate' && isCrib(url.pathname))
		event.respondWith(networkElse(request, () => kept(url.pathname)));
	else if (url.pathname.startsWith('/_app/immutable/'))
		event.respondWith(kept(url.pathname).then((held) => held ?? fetch(request)));
	else if (/^\/data-sheets\/.+\.json$/.test(url.pathname))
		event.respondWith(newestSheet(url.pathname));
});

function isCrib(path: string): boolean {
	return path === index || path.startsWith(`${index}/`);
}

async function kept(path: string): Promise<Response | undefined> {
	return (await caches.open(cacheName)).match(path, { ignoreVary: true });
}

async function networkElse(
	request: Request,
	instead: () => Promise<Response | undefined>
): Promise<Response> {
	try {
		return await fetch(request);
	} catch (error) {
		const other = await instead();
		if (other) return other;
		throw error;
	}
}

/** A public data sheet: the newest where there is a network, else the one that was read last. */
async function newestSheet(path: string): Promise<Response> {
	return networkElse(new Request(path, { credentials: 'omit' }), () => kept(path)).then(
		async (answer) => {
			if (answer.ok) await (await caches.open(cacheName)).put(path, answer.clone());
			return answer;
		}
	);
}

/** The index, each page that it names, and what those pages are made of: code, style, fonts. */
async function keepCrib(): Promise<void> {
	const cache = await caches.open(cacheName);
	const first = await keep(cache, index);
	const texts = [first];
	for (const page of new Set(found(first, /href="(\/crib\/[a-z0-9-]+)"/g)))
		texts.push(await keep(cache, page));
	const assets = new Set(texts.flatMap((text) => found(text, /(\/_app\/immutable\/[\w./-]+)/g)));
	for (const asset of assets) {
		const text = await keep(cache, asset);
		if (asset.endsWith('.css'))
			for (const font of new Set(found(text, /url\(["']?\.\/([\w.-]+\.woff2)["']?\)/g)))
				await keep(cache, asset.replace(/[^/]+$/, font));
	}
}

/** Keeps an answer. @returns its text with its Link header: a page's code is named there. */
async function keep(cache: Cache, path: string): Promise<string> {
	const answer = await fetch(path, { credentials: 'omit' });
	if (!answer.ok) throw new Error(`${path} answers ${answer.status}`);
	await cache.put(path, answer.clone());
	if (!/^text\/(html|css)/.test(answer.headers.get('content-type') ?? '')) return '';
	return `${answer.headers.get('link') ?? ''}\n${await answer.text()}`;
}

function found(text: string, shape: RegExp): string[] {
	return [...text.matchAll(shape)].map((one) => one[1] ?? '');
}

/**
 * The pages of the fakes: plain on purpose, so that nobody takes one for Ringland or for a real
 * service.
 * @param {string} title
 * @param {string} body
 */
export function page(title, body) {
	return `<!doctype html>
<html lang="en">
<head>
<meta charset="utf-8">
<meta name="viewport" content="width=device-width, initial-scale=1">
<title>${escapeHtml(title)}</title>
<style>
:root { color-scheme: light dark; }
body { font: 16px/1.5 system-ui, sans-serif; max-width: 56rem; margin: 0 auto; padding: 1rem; }
.stand-in { border: 2px dashed; padding: .5rem .75rem; }
table { border-collapse: collapse; width: 100%; }
th, td { text-align: left; padding: .4rem .75rem .4rem 0; border-bottom: 1px solid; vertical-align: top; overflow-wrap: anywhere; }
label { display: block; margin: 1rem 0 .25rem; }
input { font: inherit; padding: .5rem; width: 100%; max-width: 22rem; box-sizing: border-box; }
button, .button { font: inherit; padding: .5rem 1rem; margin: 1rem .5rem 0 0; display: inline-block; }
pre { white-space: pre-wrap; overflow-wrap: anywhere; }
iframe { width: 100%; height: 36rem; border: 1px solid; background: #fff; }
</style>
</head>
<body>
<main>
${body}
</main>
</body>
</html>
`;
}

/** @param {unknown} text */
export function escapeHtml(text) {
	return String(text)
		.replaceAll('&', '&amp;')
		.replaceAll('<', '&lt;')
		.replaceAll('>', '&gt;')
		.replaceAll('"', '&quot;')
		.replaceAll("'", '&#39;');
}

/**
 * @param {import('node:http').ServerResponse} response
 * @param {number} status
 * @param {string} html
 * @param {string} [policy] added to the Content-Security-Policy
 */
export function sendHtml(response, status, html, policy = '') {
	response.writeHead(status, {
		'content-type': 'text/html; charset=utf-8',
		'content-security-policy': `default-src 'none'; style-src 'unsafe-inline'; base-uri 'none'; ${policy}`,
		'referrer-policy': 'no-referrer',
		'cache-control': 'no-store'
	});
	response.end(html);
}

/**
 * @param {import('node:http').ServerResponse} response
 * @param {number} status
 * @param {unknown} value
 * @param {Record<string, string>} [headers]
 */
export function sendJson(response, status, value, headers = {}) {
	response.writeHead(status, { 'content-type': 'application/json', ...headers });
	response.end(JSON.stringify(value));
}

/**
 * A page elsewhere on the web may point a name of its own at the loopback and so read what lies
 * there; only the names of the loopback are answered.
 * @param {import('node:http').IncomingMessage} request
 */
export function isAskedLocally({ headers }) {
	return /^(localhost|127\.0\.0\.1|\[::1\])(:\d+)?$/.test(headers.host ?? '');
}

import { escapeHtml, page } from '../page.js';

/** @typedef {import('./till-store.js').Thing} Thing */

const notice =
	'<p class="stand-in">A stand-in for a payment service, on this machine only. No money moves and no real card belongs here.</p>';

/** @param {Thing} session */
function money({ amount_total: amount, currency }) {
	const digits = new Intl.NumberFormat('en', { style: 'currency', currency }).resolvedOptions()
		.maximumFractionDigits;
	return `${(amount / 10 ** (digits ?? 2)).toFixed(digits)} ${currency.toUpperCase()}`;
}

/** @param {Thing} session @param {string} [fault] */
export function payPage(session, fault) {
	const lines = session.line_items.data.map(
		(/** @type {any} */ one) =>
			`<tr><td>${escapeHtml(one.description)}</td><td>${one.quantity}</td></tr>`
	);
	const back = session.cancel_url
		? `<a class="button" href="${escapeHtml(session.cancel_url)}">Cancel and go back</a>`
		: '';
	return page(
		'Pay (stand-in)',
		`<h1>Pay ${escapeHtml(money(session))}</h1>${notice}
<table><thead><tr><th scope="col">For</th><th scope="col">How many</th></tr></thead><tbody>${lines.join('')}</tbody></table>
<form method="post" action="/till/${session.id}">
<label for="card">Card number</label>
<input id="card" name="card" inputmode="numeric" autocomplete="off" required aria-describedby="cards${fault ? ' fault' : ''}"${fault ? ' aria-invalid="true"' : ''}>
${fault ? `<p id="fault" role="alert"><strong>${escapeHtml(fault)}</strong></p>` : ''}
<p id="cards">4242 4242 4242 4242 pays. 4000 0000 0000 0002 is refused.</p>
<button>Pay</button>${back}
</form>`
	);
}

/** @param {Thing} session */
export function overPage(session) {
	const words =
		session.status === 'complete' ? 'This is already paid.' : 'The time to pay this is over.';
	const back = session.status === 'complete' ? successAddress(session) : session.cancel_url;
	return page(
		'Pay (stand-in)',
		`<h1>${words}</h1>${notice}${back ? `<p><a href="${escapeHtml(back)}">Go back</a></p>` : ''}`
	);
}

/** @param {Thing} session */
export function successAddress(session) {
	return String(session.success_url).replaceAll('{CHECKOUT_SESSION_ID}', session.id);
}

/** @param {Thing[]} sessions @param {Thing[]} events */
export function listPage(sessions, events) {
	const rows = sessions.map(
		(one) =>
			`<tr><td>${when(one)}</td><td>${escapeHtml(money(one))}</td><td>${escapeHtml(stateWords(one))}</td><td>${one.status === 'open' ? `<a href="/till/${one.id}">${one.id}</a>` : one.id}</td></tr>`
	);
	const told = events
		.slice(0, 50)
		.map(
			(one) =>
				`<tr><td>${when(one)}</td><td>${escapeHtml(one.type)}</td><td>${one.pending_webhooks ? 'waiting' : 'taken'}</td><td>${one.id}</td></tr>`
		);
	return page(
		'Till (stand-in)',
		`<h1>Till</h1>${notice}
<h2>Checkouts</h2>${table(['Made (UTC)', 'Amount', 'State', 'Number'], rows)}
<h2>Events sent</h2>${table(['Made (UTC)', 'What', 'By the school’s server', 'Number'], told)}`
	);
}

/** @param {Thing} thing */
const when = ({ created }) => new Date(created * 1000).toISOString().replace('T', ' ').slice(0, 19);

/** @param {Thing} session */
const stateWords = ({ status, payment_status: payment }) =>
	status === 'open' ? 'waiting to be paid' : payment === 'paid' ? 'paid' : 'expired';

/** @param {string[]} heads @param {string[]} rows */
function table(heads, rows) {
	if (rows.length === 0) return '<p>None yet.</p>';
	const head = heads.map((one) => `<th scope="col">${one}</th>`).join('');
	return `<table><thead><tr>${head}</tr></thead><tbody>${rows.join('\n')}</tbody></table>`;
}

import { escapeHtml, page } from '../page.js';

const notice =
	'<p class="stand-in">A stand-in for a mail server, on this machine only. No letter here has left it.</p>';

/**
 * @param {import('./mail-store.js').StoredMail[]} mails
 * @param {string | null} to
 */
export function listPage(mails, to) {
	const rows = mails.map(
		(one) => `<tr>
<td>${escapeHtml(one.at.replace('T', ' ').slice(0, 19))}</td>
<td><a href="/?to=${encodeURIComponent(one.to[0] ?? '')}">${escapeHtml(one.to.join(', '))}</a></td>
<td><a href="/messages/${one.id}">${escapeHtml(one.subject || '(no subject)')}</a></td>
</tr>`
	);
	const whose = to ? `<p>Letters to ${escapeHtml(to)}. <a href="/">All letters</a></p>` : '';
	const table = `<table>
<thead><tr><th scope="col">Taken in (UTC)</th><th scope="col">To</th><th scope="col">Subject</th></tr></thead>
<tbody>${rows.join('\n')}</tbody>
</table>`;
	return page(
		'Mailbox (stand-in)',
		`<h1>Mailbox</h1>${notice}${whose}${rows.length > 0 ? table : '<p>No letter yet.</p>'}`
	);
}

/** @param {import('./mail-store.js').StoredMail} mail */
export function mailPage(mail) {
	const html = mail.html
		? `<h2>As HTML</h2><iframe title="The letter as HTML" src="/messages/${mail.id}/html" sandbox="allow-popups allow-popups-to-escape-sandbox"></iframe>`
		: '';
	return page(
		mail.subject,
		`<p><a href="/">All letters</a></p>
<h1>${escapeHtml(mail.subject || '(no subject)')}</h1>${notice}
<table>
<tr><th scope="row">From</th><td>${escapeHtml(mail.from)}</td></tr>
<tr><th scope="row">To</th><td>${escapeHtml(mail.to.join(', '))}</td></tr>
<tr><th scope="row">Taken in</th><td>${escapeHtml(mail.at)}</td></tr>
<tr><th scope="row">Message-ID</th><td>${escapeHtml(mail.messageId ?? 'none')}</td></tr>
</table>
<h2>As text</h2>
<pre>${withLinks(mail.text)}</pre>
${html}
<p><a href="/messages/${mail.id}.eml">The letter as it came</a></p>`
	);
}

/** @param {string} text */
function withLinks(text) {
	return escapeHtml(text).replace(
		/https?:\/\/(?:(?!&(?:lt|gt|quot|#39);)[^\s)\]])+/g,
		(link) => `<a href="${link}">${link}</a>`
	);
}

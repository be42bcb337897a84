/**
 * What a person needs to know once it runs.
 * @param {import('./settings.js').Settings} settings
 * @returns {string[]}
 */
export function welcome({ host, origin, demo, mailbox, till }) {
	const loopback = /^(localhost|127\.\d+\.\d+\.\d+|\[::1\])$/.test(new URL(origin).hostname);
	const everywhere = ['0.0.0.0', '::'].includes(host) && origin.includes(host);
	return [
		'',
		`Ringland      ${origin}`,
		...(mailbox
			? [`Mailbox       http://127.0.0.1:${mailbox.pagePort}   every letter lands here`]
			: []),
		...(till
			? [
					`Till          http://127.0.0.1:${till.port}   4242 4242 4242 4242 pays, 4000 0000 0000 0002 is refused`
				]
			: []),
		...(demo ? (loopback ? demoAccounts : ['', demoRefused]) : []),
		...(everywhere ? [`HOST is ${host}: set ORIGIN to the address that people type.`] : []),
		''
	];
}

const demoRefused =
	'Demo passwords are refused, because ORIGIN is not on this machine. Start with DEMO=off.';

const demoAccounts = [
	'',
	'Demo accounts, all with the password averholm-demo:',
	'  student@averholm.example       instructor@averholm.example    verifier@averholm.example',
	'  student2@averholm.example      instructor2@averholm.example   office@averholm.example',
	'and the same at the second school: student@korrig.example, …'
];

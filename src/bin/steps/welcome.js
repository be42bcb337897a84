/**
 * What a person needs to know once it runs.
 * @param {import('./settings.js').Settings} settings
 * @returns {string[]}
 */
export function welcome({ host, origin, demo, mailbox, till }) {
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
		...(demo ? demoAccounts : []),
		...(everywhere ? [`HOST is ${host}: set ORIGIN to the address that people type.`] : []),
		''
	];
}

const demoAccounts = [
	'',
	'Demo accounts, all with the password averholm-demo:',
	'  student@averholm.example       instructor@averholm.example    verifier@averholm.example',
	'  student2@averholm.example      instructor2@averholm.example   office@averholm.example',
	'and the same at the second school: student@korrig.example, …'
];

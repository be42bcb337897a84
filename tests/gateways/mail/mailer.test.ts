import { createServer, type AddressInfo, type Socket } from 'node:net';
import { simpleParser } from 'mailparser';
import { SMTPServer, type SMTPServerOptions } from 'smtp-server';
import { afterEach, expect, it } from 'vitest';
import { makeMailer, type Letter } from '$lib/server/gateways/mail';

const letter: Letter = {
	messageId: '<01j0000000000000000000mail@ringland.example>',
	from: 'Averholm Trade School <no-reply@ringland.example>',
	to: 'student@averholm.example',
	subject: 'Märked: crankpins and shells',
	text: 'Plain words.',
	html: '<p>Plain words.</p>'
};

const closing: (() => Promise<unknown>)[] = [];
afterEach(async () => {
	for (const close of closing.splice(0)) await close();
});

function listening(server: ReturnType<typeof createServer>): Promise<number> {
	return new Promise((resolve) =>
		server.listen(0, '127.0.0.1', () => resolve((server.address() as AddressInfo).port))
	);
}

async function mailServer(options: SMTPServerOptions) {
	const server = new SMTPServer({
		disabledCommands: ['STARTTLS', 'AUTH'],
		logger: false,
		...options
	});
	server.on('error', () => undefined); // a broken line is what some of these tests make
	const port = await listening(server.server);
	closing.push(() => new Promise<void>((done) => server.close(() => done())));
	return makeMailer({ smtpUrl: `smtp://127.0.0.1:${port}` });
}

function fault(responseCode: number, words: string) {
	return Object.assign(new Error(words), { responseCode });
}

it('delivers both bodies under the given Message-ID', async () => {
	const got: Buffer[] = [];
	const mailer = await mailServer({
		onData(stream, _session, done) {
			stream.on('data', (chunk: Buffer) => got.push(chunk));
			stream.on('end', () => done());
		}
	});
	expect(await mailer.send(letter)).toMatchObject({ kind: 'sent' });
	const read = await simpleParser(Buffer.concat(got));
	expect([read.messageId, read.subject, read.text?.trim(), read.html]).toEqual([
		letter.messageId,
		letter.subject,
		letter.text,
		letter.html
	]);
	expect(read.headers.get('auto-submitted')).toBe('auto-generated');
});

it.each([
	[
		'an unknown address',
		{ onRcptTo: (_a, _s, done) => done(fault(550, 'No such mailbox')) },
		'refused'
	],
	['a full mailbox', { onRcptTo: (_a, _s, done) => done(fault(452, 'Mailbox full')) }, 'later'],
	['a refused sender', { onMailFrom: (_a, _s, done) => done(fault(553, 'Not yours')) }, 'refused'],
	[
		'a letter refused after it was read',
		{
			onData: (stream, _s, done) => void stream.resume().on('end', () => done(fault(554, 'Spam')))
		},
		'refused'
	],
	[
		'a server that is out of room after reading',
		{
			onData: (stream, _s, done) => void stream.resume().on('end', () => done(fault(451, 'Later')))
		},
		'later'
	],
	[
		'a server that turns everyone away',
		{ onConnect: (_s, done) => done(fault(554, 'Go away')) },
		'later'
	],
	[
		'a server that wants a password',
		{ disabledCommands: ['STARTTLS'], authOptional: false },
		'later'
	]
] satisfies [string, SMTPServerOptions, string][])(
	'takes %s as told',
	async (_name, options, outcome) => {
		const mailer = await mailServer(options);
		const delivery = await mailer.send(letter);
		expect(delivery.kind, JSON.stringify(delivery)).toBe(outcome);
	}
);

it('signs in, and tries later when the password is wrong', async () => {
	const server = new SMTPServer({
		disabledCommands: ['STARTTLS'],
		allowInsecureAuth: true,
		onAuth: ({ username, password }, _session, done) =>
			username === 'till' && password === 'p@ss:word'
				? done(null, { user: 'till' })
				: done(fault(535, 'Wrong')),
		onData: (stream, _session, done) => void stream.resume().on('end', () => done())
	});
	const port = await listening(server.server);
	closing.push(() => new Promise<void>((done) => server.close(() => done())));
	const at = (user: string) => makeMailer({ smtpUrl: `smtp://${user}@127.0.0.1:${port}` });
	expect((await at('till:p%40ss%3Aword').send(letter)).kind).toBe('sent');
	expect((await at('till:other').send(letter)).kind).toBe('later');
});

/** A server that speaks by a script and drops the line where told to. */
async function droppingServer(dropAt: 'greeting' | 'rcpt' | 'data' | 'body' | 'dot') {
	const sockets = new Set<Socket>();
	const server = createServer((socket) => {
		sockets.add(socket);
		socket.on('error', () => undefined);
		if (dropAt === 'greeting') return socket.destroy();
		socket.write('220 here\r\n');
		let reading = false;
		let body = '';
		socket.on('data', (chunk) => {
			const said = chunk.toString('latin1');
			if (reading) {
				body += said;
				if (dropAt === 'body' || body.endsWith('\r\n.\r\n')) socket.destroy();
			} else if (/^RCPT/.test(said) && dropAt === 'rcpt') socket.destroy();
			else if (/^DATA/.test(said)) {
				if (dropAt === 'data') return socket.destroy();
				reading = true;
				socket.write('354 go on\r\n');
			} else socket.write('250 yes\r\n');
		});
	});
	const port = await listening(server);
	closing.push(
		() =>
			new Promise<void>((done) => {
				for (const socket of sockets) socket.destroy();
				server.close(() => done());
			})
	);
	return makeMailer({ smtpUrl: `smtp://127.0.0.1:${port}` });
}

it.each([
	['greeting', 'later'],
	['rcpt', 'later'],
	['data', 'later'],
	['body', 'unsure'],
	['dot', 'unsure']
] as const)('knows what a line that breaks at the %s means', async (dropAt, outcome) => {
	const mailer = await droppingServer(dropAt);
	const long = { ...letter, text: 'x'.repeat(200_000) };
	expect((await mailer.send(dropAt === 'body' ? long : letter)).kind).toBe(outcome);
});

it('does not know when the server falls silent after the letter', async () => {
	const server = createServer((socket) => {
		socket.on('error', () => undefined);
		socket.write('220 here\r\n');
		let reading = false;
		socket.on('data', (chunk) => {
			if (reading) return;
			reading = /^DATA/.test(chunk.toString());
			socket.write(reading ? '354 go on\r\n' : '250 yes\r\n');
		});
	});
	const port = await listening(server);
	closing.push(() => new Promise<void>((done) => server.close(() => done())));
	const timeouts = { connectionTimeout: 1000, greetingTimeout: 1000, socketTimeout: 300 };
	const mailer = makeMailer({ smtpUrl: `smtp://127.0.0.1:${port}`, timeouts });
	expect((await mailer.send(letter)).kind).toBe('unsure');
});

it('tries later when nobody listens, and refuses what is no address', async () => {
	const server = createServer();
	const port = await listening(server);
	await new Promise((done) => server.close(done));
	const mailer = makeMailer({ smtpUrl: `smtp://127.0.0.1:${port}` });
	expect((await mailer.send(letter)).kind).toBe('later');
	expect((await mailer.send({ ...letter, to: '' })).kind).toBe('refused');
	expect((await mailer.send({ ...letter, to: 'a@x.example, b@x.example' })).kind).toBe('refused');
});

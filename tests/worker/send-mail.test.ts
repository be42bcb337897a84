import { SMTPServer } from 'smtp-server';
import { afterEach, expect, it } from 'vitest';
import { mails } from '$lib/server/data/models';
import { enqueueMail } from '$lib/server/data/queries/mails';
import { find, update } from '$lib/server/data/rows';
import { makeMailer } from '$lib/server/gateways/mail';
import { makeHouse, type TestHouse } from '../support/house';

let close: (() => Promise<void>)[] = [];
afterEach(async () => {
	for (const one of close) await one();
	close = [];
});

/** A real mail server; `answer` is what it says to each letter in turn. */
async function mailServer(answers: (Error | null)[]): Promise<{ port: number; letters: string[] }> {
	const letters: string[] = [];
	const server = new SMTPServer({
		authOptional: true,
		disabledCommands: ['STARTTLS'],
		onData(stream, _session, done) {
			let text = '';
			stream.on('data', (chunk: Buffer) => (text += chunk.toString()));
			stream.on('end', () => {
				const answer = answers.length > 1 ? answers.shift() : answers[0];
				if (!answer) letters.push(text);
				done(answer ?? null);
			});
		}
	});
	await new Promise<void>((resolve) => server.listen(0, '127.0.0.1', resolve));
	close.push(() => new Promise((resolve) => server.close(() => resolve())));
	const { port } = server.server.address() as { port: number };
	return { port, letters };
}

async function houseWith(port: number): Promise<TestHouse> {
	const house = await makeHouse();
	house.gateways.mailer = makeMailer({ smtpUrl: `smtp://127.0.0.1:${port}` });
	close.push(() => house.close());
	const letter = {
		kind: 'password-reset',
		to: 'anna@quay.example',
		payload: { heldForMinutes: 60 },
		links: { link: 'https://ringland.example/password/secret-token' }
	};
	let n = 0;
	await house.lay((scope) =>
		enqueueMail(scope, house.gateways.signing, letter, () => `MAIL${n++}`, house.now())
	);
	return house;
}

const state = (house: TestHouse) => find(house.look, mails, { id: 'MAIL0' });

it('sends a letter once, with its link inside, and wipes the link', async () => {
	const { port, letters } = await mailServer([null]);
	const house = await houseWith(port);
	expect((await state(house))?.sealed).not.toContain('secret-token');
	await house.work();
	expect(letters).toHaveLength(1);
	expect(letters[0]?.replaceAll('=\r\n', '')).toContain('secret-token');
	expect(letters[0]).toContain('Message-ID: <mail0@ringland.example>');
	expect(await state(house)).toMatchObject({ state: 'sent', sealed: null, attempts: 1 });
	await house.work();
	expect(letters).toHaveLength(1);
});

it('tries again later, under the same Message-ID, when the server says so', async () => {
	const busy = Object.assign(new Error('busy'), { responseCode: 451 });
	const { port, letters } = await mailServer([busy, null]);
	const house = await houseWith(port);
	await house.work();
	expect(await state(house)).toMatchObject({ state: 'waiting', attempts: 1 });
	expect((await state(house))?.sealed).not.toBeNull();
	house.passMs(60_000);
	await house.work();
	expect(await state(house)).toMatchObject({ state: 'sent', attempts: 2 });
	expect(letters).toHaveLength(1);
});

it('does not go on about an address that is refused', async () => {
	const { port } = await mailServer([
		Object.assign(new Error('no such user'), { responseCode: 550 })
	]);
	const house = await houseWith(port);
	await house.work();
	expect(await state(house)).toMatchObject({ state: 'refused', sealed: null });
});

it('shows what was interrupted between sending and recording, and does not guess', async () => {
	const { port, letters } = await mailServer([null]);
	const house = await houseWith(port);
	await house.lay(
		async (scope) => void (await update(scope, mails, { id: 'MAIL0' }, { state: 'sending' }))
	);
	await house.work();
	expect(await state(house)).toMatchObject({ state: 'unsure' });
	expect(letters).toHaveLength(0);
});

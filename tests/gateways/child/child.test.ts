import { afterEach, expect, it } from 'vitest';
import { Problem } from '$lib/domain/problem';
import { makeChild, type Child, type ChildOptions } from '$lib/server/gateways/child/child';

/** Does what it is told, so that each way of ending can be seen. */
const source = `
import sharp from 'sharp';
const held = [];
process.on('disconnect', () => process.exit(0));
process.on('message', async ({ number, input }) => {
	const say = (answer) => process.send({ number, ...answer });
	if (input === 'die') process.exit(3);
	if (input === 'hang') return setInterval(() => {}, 1000);
	if (input === 'eat') for (;;) held.push(new Array(1e6).fill({ n: Math.random() }));
	if (input === 'problem') return say({ kind: 'problem', code: 'input', words: 'No {what}.', parameters: { what: 'bolt' } });
	if (input === 'fault') return say({ kind: 'fault', text: 'a fault of ours' });
	if (input === 'environment') return say({ kind: 'done', value: Object.keys(process.env).filter((one) => one !== 'VIPSHOME') });
	say({ kind: 'done', value: { pid: process.pid, input, sharp: typeof sharp } });
});
`;

const children: Child<unknown, unknown>[] = [];
afterEach(async () => {
	for (const child of children.splice(0)) await child.close();
});

function child(options: Partial<ChildOptions> = {}) {
	const made = makeChild<string, { pid: number; input: string; sharp: string }>({
		source,
		nextTo: import.meta.url,
		heapMb: 64,
		answerWithinMs: 5000,
		...options
	});
	children.push(made as Child<unknown, unknown>);
	return made;
}

it('finds its packages from beside the caller, and answers in turn from one process', async () => {
	const asked = child();
	const answers = await Promise.all(['a', 'b', 'c'].map((one) => asked.ask(one)));
	expect(answers.map((one) => [one.input, one.sharp])).toEqual([
		['a', 'function'],
		['b', 'function'],
		['c', 'function']
	]);
	expect(new Set(answers.map((one) => one.pid)).size).toBe(1);
});

// The image library sets VIPSHOME itself.
it('holds no environment of its parent', async () => {
	process.env.SECRET_OF_THIS_TEST = 'x';
	expect(await child().ask('environment')).toEqual([]);
	delete process.env.SECRET_OF_THIS_TEST;
});

it.each([
	['die', 'died'],
	['eat', 'died'],
	['fault', 'fault']
])('says when the child comes to %s, and goes on with the next', async (input, reason) => {
	const asked = child();
	const [first, second] = await Promise.allSettled([asked.ask(input), asked.ask('next')]);
	expect(first).toMatchObject({ status: 'rejected', reason: { name: 'ChildFault', reason } });
	expect(second).toMatchObject({ status: 'fulfilled', value: { input: 'next' } });
});

it('does not wait for ever', async () => {
	const asked = child({ answerWithinMs: 700 });
	await expect(asked.ask('hang')).rejects.toMatchObject({ reason: 'too-slow' });
	expect((await asked.ask('next')).input).toBe('next');
});

it('hands an expected problem on as one', async () => {
	const refused = await child()
		.ask('problem')
		.catch((error: unknown) => error);
	expect(refused).toBeInstanceOf(Problem);
	expect(refused).toMatchObject({
		code: 'input',
		words: 'No {what}.',
		parameters: { what: 'bolt' }
	});
});

it('lets an idle child go, and starts another when asked', async () => {
	const asked = child({ restAfterMs: 50 });
	const { pid } = await asked.ask('a');
	await expect
		.poll(() => {
			try {
				return process.kill(pid, 0);
			} catch {
				return 'gone';
			}
		})
		.toBe('gone');
	expect((await asked.ask('b')).pid).not.toBe(pid);
});

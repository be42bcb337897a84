import { fork } from 'node:child_process';
import { once } from 'node:events';
import { inProject, project } from './project.js';
import { held } from './serve.js';
import { Stop } from './say.js';

/**
 * The local stand-ins, each in a process of its own, only for what has no real service.
 * Settings go over the line between the processes: they hold secrets, which arguments and
 * environments show to others.
 * @param {Pick<import('./settings.js').Settings, 'mailbox' | 'till'>} settings
 */
export async function startFakes({ mailbox, till }) {
	const wanted = [mailbox && startFake('smtp', mailbox), till && startFake('stripe', till)].filter(
		(one) => one !== null
	);
	const settled = await Promise.allSettled(wanted);
	const fakes = settled.flatMap((one) => (one.status === 'fulfilled' ? [one.value] : []));
	const failed = settled.find((one) => one.status === 'rejected');
	if (!failed) return fakes;
	await Promise.all(fakes.map((one) => one.end()));
	throw failed.reason;
}

/**
 * @param {'smtp' | 'stripe'} name
 * @param {object} settings
 */
async function startFake(name, settings) {
	const child = fork(inProject('src', 'fakes', name, 'main.js'), { cwd: project });
	const running = held(child);
	child.send(settings);
	const first = await Promise.race([once(child, 'message'), running.gone.then(() => [null])]);
	if (first[0] === 'listening') return running;
	await running.end();
	throw new Stop(first[0]?.because ?? `The stand-in for ${name} ended before it was ready.`);
}

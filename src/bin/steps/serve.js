import { spawn } from 'node:child_process';
import { once } from 'node:events';
import { get } from 'node:http';
import { setTimeout as wait } from 'node:timers/promises';
import { inProject, project } from './project.js';
import { reachable } from './settings.js';
import { Stop } from './say.js';

/**
 * @typedef {object} Running
 * @property {import('node:child_process').ChildProcess} child
 * @property {Promise<unknown>} gone
 * @property {(withinMs?: number) => Promise<void>} end asks, then insists
 */

const withParent = ['--import', inProject('src/bin/steps/end-with-parent.js')];

/**
 * The production server from a build's folder.
 * @param {import('./settings.js').Settings} settings
 * @param {string} folder
 * @param {import('node:child_process').StdioOptions} [stdio]
 */
export function serve({ serverEnv }, folder, stdio = ['ignore', 'inherit', 'inherit', 'ipc']) {
	const words = [...withParent, `${folder}/index.js`];
	return held(spawn(process.execPath, words, { cwd: project, env: serverEnv, stdio }));
}

/** The same with reload, for contributors. @param {import('./settings.js').Settings} settings */
export function serveWithReload({ serverEnv, host, port }) {
	const vite = inProject('node_modules/vite/bin/vite.js');
	const words = [
		...withParent,
		vite,
		'dev',
		'--host',
		host,
		'--port',
		String(port),
		'--strictPort'
	];
	const env = { ...serverEnv, NODE_ENV: 'development' };
	const stdio = /** @type {const} */ (['inherit', 'inherit', 'inherit', 'ipc']);
	return held(spawn(process.execPath, words, { cwd: project, env, stdio: [...stdio] }));
}

/**
 * @param {import('node:child_process').ChildProcess} child
 * @returns {Running}
 */
export function held(child) {
	const gone = once(child, 'exit').catch((error) => [error]);
	return {
		child,
		gone,
		async end(withinMs = 9000) {
			if (child.exitCode !== null || child.signalCode !== null) return;
			child.kill('SIGTERM');
			const insist = setTimeout(() => child.kill('SIGKILL'), withinMs);
			await gone;
			clearTimeout(insist);
		}
	};
}

/**
 * Waits until the server says that it is ready: its migrations and its first seed come before.
 * @param {import('./settings.js').Settings} settings
 * @param {Running} server
 */
export async function ready({ host, port, origin }, { child }) {
	const address = `http://${reachable(host)}:${port}/readyz`;
	while (!(await answers(address, new URL(origin).host))) {
		if (child.exitCode !== null || child.signalCode !== null)
			throw new Stop('The server ended before it was ready (see above).');
		await wait(100);
	}
}

/** @param {string} address @param {string} host @returns {Promise<boolean>} */
function answers(address, host) {
	return new Promise((resolve) => {
		const request = get(address, { headers: { host }, agent: false, timeout: 5000 }, (response) => {
			response.resume();
			resolve(response.statusCode === 200);
		});
		request.once('timeout', () => request.destroy());
		request.once('error', () => resolve(false));
	});
}

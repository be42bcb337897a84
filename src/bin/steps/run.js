import { spawn } from 'node:child_process';
import { project } from './project.js';

/** @type {Set<import('node:child_process').ChildProcess>} */
const running = new Set();

/**
 * Runs a command to its end with our own terminal.
 * @param {string} command
 * @param {string[]} words
 * @param {{ env?: NodeJS.ProcessEnv, quiet?: boolean }} [options]
 * @returns {Promise<{ code: number, output: string }>} output only when quiet
 */
export function run(command, words, { env = process.env, quiet = false } = {}) {
	return new Promise((resolve, reject) => {
		const child = spawn(command, words, {
			cwd: project,
			env: quiet ? { ...env, NO_COLOR: '1', FORCE_COLOR: undefined } : env,
			stdio: quiet ? ['ignore', 'pipe', 'pipe'] : 'inherit'
		});
		let output = '';
		child.stdout?.on('data', (bytes) => (output += bytes));
		child.stderr?.on('data', (bytes) => (output += bytes));
		running.add(child);
		child.once('error', reject);
		child.once('close', (code, signal) => {
			running.delete(child);
			resolve({ code: code ?? (signal ? 1 : 0), output });
		});
	});
}

/** A program that a package of ours brought along. @param {string} name */
export const brought = (name) => `${project}/node_modules/.bin/${name}`;

/** Ends what still runs, so that stopping one of our commands leaves nothing behind. */
export function endRunning() {
	for (const child of running) child.kill('SIGTERM');
}

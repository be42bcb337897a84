import { accessSync, constants } from 'node:fs';
import { delimiter, join } from 'node:path';
import { run } from './run.js';
import { say } from './say.js';

/** What the tests need of the machine: a program and Debian's package that brings it. */
const needed = [
	{ program: 'chromium', debian: 'chromium', because: 'the end-to-end tests run in it' },
	{ program: 'pdftotext', debian: 'poppler-utils', because: 'the certificates are read with it' }
];

/**
 * Brings what is absent, where that is allowed and possible; says what to install where not.
 * @returns {Promise<void>}
 */
export async function readyMachine() {
	const absent = needed.filter(({ program }) => !found(program));
	if (absent.length === 0) return;
	const packages = absent.map(({ debian }) => debian);
	if (process.getuid?.() === 0 && found('apt-get')) {
		say(`Installing ${packages.join(' and ')} with apt.`);
		const env = { ...process.env, DEBIAN_FRONTEND: 'noninteractive' };
		const update = await run('apt-get', ['update', '-q'], { env, quiet: true });
		const words = ['install', '-y', '-q', '--no-install-recommends', ...packages];
		const install = await run('apt-get', words, { env, quiet: true });
		if (install.code !== 0) say(`${update.output}\n${install.output}`);
	}
	for (const { program, debian, because } of absent)
		if (!found(program)) say(`Install ${debian} (${because}): apt-get install ${debian}`);
}

/** @param {string} program @returns {string | undefined} */
export function found(program) {
	const folders = (process.env.PATH ?? '').split(delimiter).filter((one) => one !== '');
	return folders
		.map((folder) => join(folder, program))
		.find((path) => {
			try {
				accessSync(path, constants.X_OK);
				return true;
			} catch {
				return false;
			}
		});
}

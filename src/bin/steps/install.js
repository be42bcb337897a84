import { existsSync, readFileSync, writeFileSync } from 'node:fs';
import { dirname, join } from 'node:path';
import { fingerprint } from './fingerprint.js';
import { inProject } from './project.js';
import { run } from './run.js';
import { say, seconds, Stop } from './say.js';

const stamp = inProject('node_modules', '.installed-from');
const driver = inProject('node_modules', 'sqlite3', 'build', 'Release', 'node_sqlite3.node');

/** Installs from the lock file when node_modules is missing, or was made from another or elsewhere. */
export async function install() {
	const lock = fingerprint(['package.json', 'package-lock.json'], []);
	// The version of Node's binary interface: a new patch of Node needs no new install.
	const machine = [process.platform, process.arch, process.versions.modules].join(' ');
	const [madeFrom, madeOn] = existsSync(stamp) ? readFileSync(stamp, 'utf8').split('\n') : [];
	const fits = madeOn === undefined || madeOn === machine;
	const current = fits && (madeFrom === lock || agreesWithLock()) && existsSync(driver);
	if (!current) await installFromLock();
	if (!current || madeFrom !== lock) writeFileSync(stamp, `${lock}\n${machine}`);
}

async function installFromLock() {
	const startedAtMs = Date.now();
	say('Installing packages from the lock file. The database driver may be compiled: minutes.');
	const { code } = await npm(['ci', '--include=dev', '--no-audit', '--no-fund']);
	if (code !== 0)
		throw new Stop(
			'npm ci failed (see above). To compile sqlite3 it needs python3, make and g++; otherwise it needs the registry.'
		);
	// Some npm versions hold back install scripts; without the driver nothing would run.
	if (!existsSync(driver)) await npm(['rebuild', 'sqlite3']);
	if (!existsSync(driver))
		throw new Stop('sqlite3 has no driver here. Install python3, make and g++, then start again.');
	say(`Installed in ${seconds(startedAtMs)}.`);
}

/** @param {string[]} words */
function npm(words) {
	const nodedir = process.env.npm_config_nodedir ?? headersAt();
	const env = { ...process.env, ...(nodedir ? { npm_config_nodedir: nodedir } : {}) };
	const script = process.env.npm_execpath;
	return script?.endsWith('.js')
		? run(process.execPath, [script, ...words], { env })
		: run('npm', words, { env });
}

/**
 * Where this Node's own headers lie, so that compiling needs no download: beside the program,
 * or where Debian puts them. Headers of another version are worse than none.
 */
function headersAt() {
	const places = [dirname(dirname(process.execPath)), '/usr', '/usr/local'];
	return places.find((place) => {
		const file = join(place, 'include', 'node', 'node_version.h');
		if (!existsSync(file)) return false;
		const text = readFileSync(file, 'utf8');
		const numbers = ['MAJOR', 'MINOR', 'PATCH'].map(
			(part) => new RegExp(`#define NODE_${part}_VERSION (\\d+)`).exec(text)?.[1]
		);
		return `v${numbers.join('.')}` === process.version;
	});
}

/**
 * npm notes what it put into node_modules once it has finished. When that note already agrees
 * with the lock file (somebody ran npm themselves), installing again would only cost minutes.
 */
function agreesWithLock() {
	const note = inProject('node_modules', '.package-lock.json');
	if (!existsSync(note)) return false;
	const have = packagesIn(note);
	const want = packagesIn(inProject('package-lock.json'));
	return Object.entries(want).every(([path, one]) => {
		const other = have[path];
		if (path === '') return true;
		return other ? other.version === one.version : one.optional === true;
	});
}

/**
 * @param {string} file
 * @returns {Record<string, { version?: string, optional?: boolean }>}
 */
function packagesIn(file) {
	return JSON.parse(readFileSync(file, 'utf8')).packages ?? {};
}

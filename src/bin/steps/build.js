import {
	existsSync,
	lstatSync,
	readdirSync,
	readFileSync,
	renameSync,
	rmSync,
	statSync,
	symlinkSync,
	writeFileSync
} from 'node:fs';
import { fingerprint } from './fingerprint.js';
import { inProject } from './project.js';
import { brought, run } from './run.js';
import { say, seconds, Stop } from './say.js';

const sources = [
	'src',
	'lessons',
	'static',
	'package-lock.json',
	'svelte.config.js',
	'vite.config.ts',
	'mdsvex.config.js',
	'postcss.config.js',
	'tailwind.config.ts',
	'tsconfig.json'
];

/**
 * Builds when the sources changed. Each build lies in a folder named after its sources, made
 * aside and then renamed, and `build` is a link to the newest: a server that runs from an older
 * one keeps every file that it may still load. Renaming over one folder was rejected for that.
 * @returns {Promise<string>} the folder to run from
 */
export async function build() {
	const name = `build-${fingerprint(sources, [process.version], notBuilt).slice(0, 12)}`;
	const folder = inProject(name);
	if (!existsSync(`${folder}/stamp`)) await buildInto(name);
	if (currentBuild() !== name) pointAt(name);
	return folder;
}

/** The commands and the fakes run as they are written. @param {string} path */
const notBuilt = (path) => path === 'src/fakes' || /^src\/bin\/.*(\.js|steps)$/.test(path);

/** @param {string} name */
async function buildInto(name) {
	const startedAtMs = Date.now();
	const aside = `${name}.part-${process.pid}`;
	say('Building, because the sources changed.');
	const env = { ...process.env, NODE_ENV: 'production', RINGLAND_BUILD_OUT: aside };
	const { code, output } = await run(brought('vite'), ['build', '--logLevel', 'warn'], {
		env,
		quiet: true
	});
	if (code !== 0) {
		rmSync(inProject(aside), { recursive: true, force: true });
		throw new Stop(`${output}\nThe build failed (see above).`);
	}
	writeFileSync(inProject(aside, 'stamp'), name);
	rmSync(inProject(name), { recursive: true, force: true });
	renameSync(inProject(aside), inProject(name));
	say(`Built in ${seconds(startedAtMs)}.`);
}

function currentBuild() {
	const stamp = inProject('build', 'stamp');
	return existsSync(stamp) ? readFileSync(stamp, 'utf8') : undefined;
}

/** @param {string} name */
function pointAt(name) {
	const link = inProject('build');
	const fresh = inProject(`build-link-${process.pid}`);
	const found = lstatSync(link, { throwIfNoEntry: false });
	// A plain `vite build` leaves a folder there.
	if (found && !found.isSymbolicLink()) rmSync(link, { recursive: true, force: true });
	symlinkSync(name, fresh, 'dir');
	renameSync(fresh, link);
	forgetOld(name);
}

/** The two builds before this one stay, for servers that still run from them. @param {string} name */
function forgetOld(name) {
	const builds = readdirSync(inProject())
		.filter((one) => /^build-[0-9a-f]{12}$/.test(one) && one !== name)
		.map((one) => ({ one, atMs: statSync(inProject(one)).mtimeMs }))
		.sort((a, b) => b.atMs - a.atMs);
	for (const { one } of builds.slice(2)) rmSync(inProject(one), { recursive: true, force: true });
}

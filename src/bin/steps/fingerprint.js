import { createHash } from 'node:crypto';
import { readdirSync, readFileSync, statSync } from 'node:fs';
import { join, relative } from 'node:path';
import { project } from './project.js';

/**
 * A hash over the names and contents of files and folders. Contents and not times, because a
 * fresh clone or a switched branch gives every file a new time.
 * @param {string[]} paths from the project's root; what is absent counts as absent
 * @param {string[]} facts anything else that the result depends on
 * @param {(path: string) => boolean} [leaveOut] asked for every file and folder
 */
export function fingerprint(paths, facts, leaveOut = () => false) {
	const hash = createHash('sha256');
	for (const fact of facts) hash.update(`${fact}\0`);
	for (const path of paths) {
		for (const file of filesUnder(join(project, path), leaveOut)) {
			const content = createHash('sha256').update(readFileSync(file)).digest('hex');
			hash.update(`${relative(project, file)}\0${content}\0`);
		}
	}
	return hash.digest('hex');
}

/**
 * @param {string} path
 * @param {(path: string) => boolean} leaveOut
 * @returns {string[]}
 */
function filesUnder(path, leaveOut) {
	const found = statSync(path, { throwIfNoEntry: false });
	if (!found || leaveOut(relative(project, path))) return [];
	if (!found.isDirectory()) return [path];
	return readdirSync(path)
		.sort()
		.flatMap((name) => filesUnder(join(path, name), leaveOut));
}

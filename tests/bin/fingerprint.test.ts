import { mkdirSync, mkdtempSync, rmSync, utimesSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join, relative } from 'node:path';
import { afterEach, beforeEach, expect, it } from 'vitest';
import { fingerprint } from '../../src/bin/steps/fingerprint.js';
import { project } from '../../src/bin/steps/project.js';

let folder: string;
let path: string;
beforeEach(() => {
	folder = mkdtempSync(join(tmpdir(), 'fingerprint-'));
	path = relative(project, folder);
	mkdirSync(join(folder, 'a'));
	writeFileSync(join(folder, 'a', 'one.ts'), 'one');
});
afterEach(() => rmSync(folder, { recursive: true }));

const now = (leaveOut?: (path: string) => boolean) => fingerprint([path], ['v20'], leaveOut);

it('follows names and contents, and nothing else of a file', () => {
	const before = now();
	utimesSync(join(folder, 'a', 'one.ts'), 1, 1);
	expect(now()).toBe(before);
	writeFileSync(join(folder, 'a', 'one.ts'), 'two');
	const changed = now();
	expect(changed).not.toBe(before);
	writeFileSync(join(folder, 'a', 'two.ts'), '');
	expect(now()).not.toBe(changed);
	expect(now((one) => one.endsWith('two.ts'))).toBe(changed);
	expect(fingerprint([path], ['v22'])).not.toBe(now());
	expect(fingerprint([path, 'no/such/place'], ['v20'])).toBe(now());
});

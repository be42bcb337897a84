import { createHash } from 'node:crypto';
import canonicalize from 'canonicalize';
import { afterEach, expect, it } from 'vitest';
import { exportLedger, readLedgerPage } from '$lib/server/services/office/read-records';
import { almostFinished, type Course } from '../awards/finished-course';

let course: Course;
afterEach(() => course.house.close());

/** As the page tells an auditor to do it, with nothing of ours. */
function check(text: string): number {
	let before = '0'.repeat(64);
	const lines = text.trimEnd().split('\n');
	for (const line of lines) {
		const { hash, ...entry } = JSON.parse(line) as { hash: string; previousHash: string };
		if (entry.previousHash !== before) throw new Error('it does not follow');
		const sealed = canonicalize(entry) ?? '';
		if (createHash('sha256').update(sealed).digest('hex') !== hash) throw new Error('changed');
		before = hash;
	}
	return lines.length;
}

it('the ledger taken away as a file can be checked by anybody', async () => {
	course = await almostFinished();
	const admin = await course.admin.caller();
	const { text, fileName } = await exportLedger(admin, {});
	const page = await readLedgerPage(admin, {});
	expect(page.fault).toBeNull();
	expect(check(text)).toBe(page.total);
	expect(fileName).toBe(`ledger-averholm-${page.total}.jsonl`);
	expect(text).not.toContain(course.student.email);
	expect(() => check(text.replace('"quantity":1', '"quantity":9'))).toThrow('changed');
	await expect(exportLedger(await course.student.caller(), {})).rejects.toMatchObject({
		code: 'absent'
	});
});

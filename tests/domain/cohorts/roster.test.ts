import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { planRoster } from '$lib/domain/cohorts/plan-roster';
import { longestRoster, readRoster } from '$lib/domain/cohorts/read-roster';

describe('a list is read as spreadsheets and people write it', () => {
	it.each([
		['commas', 'Anna Strand,Anna@quay.example,Q-1\nPer Dalby,per@quay.example'],
		[
			'semicolons and headings',
			'name;e-mail;number\nAnna Strand;anna@quay.example;Q-1\nPer Dalby;per@quay.example;'
		],
		[
			'tabs, headings in another order',
			'E-mail\tStudent number\tName\nanna@quay.example\tQ-1\tAnna Strand\nper@quay.example\t\tPer Dalby'
		],
		[
			'a byte order mark and empty lines',
			'\uFEFFAnna Strand,anna@quay.example,Q-1\r\n\r\nPer Dalby,per@quay.example\r\n'
		]
	])('with %s', (_, text) => {
		const { rows, fault } = readRoster(text);
		expect(fault).toBeUndefined();
		expect(rows.map(({ name, email, studentNumber }) => [name, email, studentNumber])).toEqual([
			['Anna Strand', 'anna@quay.example', 'Q-1'],
			['Per Dalby', 'per@quay.example', '']
		]);
	});
	it('keeps a comma inside quotation marks', () => {
		expect(readRoster('"Strand, Anna",anna@quay.example').rows[0]?.name).toBe('Strand, Anna');
	});
	it.each([
		['', 'empty'],
		['name,number\nAnna,1', 'no e-mail column'],
		['"Anna,anna@quay.example', 'quotation mark'],
		[
			Array.from({ length: longestRoster + 1 }, (_, i) => `N${i},n${i}@x.example`).join('\n'),
			'at most'
		]
	])('refuses what cannot be read, with the reason', (text, because) => {
		expect(readRoster(text).fault).toContain(because);
	});
});

describe('the dry run', () => {
	const row = (email: string, name = 'Anna', line = 1) => ({
		line,
		name,
		email,
		studentNumber: ''
	});
	it('names every fault of a row', () => {
		const plan = planRoster([row('not an address', '')], new Set(), 5);
		expect(plan.rows[0]?.faults).toEqual([
			'The name is missing.',
			'“not an address” is not an e-mail address.'
		]);
	});
	it('gives places in the order of the list and never more than are free', () => {
		const emails = fc.uniqueArray(fc.integer({ min: 0, max: 99 }), { maxLength: 40 });
		fc.assert(
			fc.property(emails, fc.integer({ min: 0, max: 20 }), (numbers, free) => {
				const rows = numbers.map((n, i) => row(`s${n}@x.example`, 'Anna', i + 1));
				const { counts, rows: planned } = planRoster(rows, new Set(['s1@x.example']), free);
				expect(counts.invite).toBeLessThanOrEqual(free);
				expect(counts.invite + counts.wait + counts.already + counts.fault).toBe(rows.length);
				const outcomes = planned
					.map((one) => one.outcome)
					.filter((one) => one === 'invite' || one === 'wait');
				expect(
					outcomes.indexOf('wait') < 0 || outcomes.lastIndexOf('invite') < outcomes.indexOf('wait')
				).toBe(true);
			})
		);
	});
});

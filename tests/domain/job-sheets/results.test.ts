import { describe, expect, it } from 'vitest';
import { catalogue } from '$lib/content/catalogue';
import { missingFrom } from '$lib/domain/job-sheets/complete';
import { resultsOf, slips } from '$lib/domain/job-sheets/results';
import { applyOperation, emptySubmission } from '$lib/domain/job-sheets/submission';

const course = catalogue().courseByKey('reading-failed-engines');
const jobSheet = course?.jobSheets.find((one) => one.key === 'crankpins-and-shells');
if (!course || !jobSheet) throw new Error('the job sheet is gone');
const { sheet } = course;
const readings = {
	pin: [
		[39.975, 39.968],
		[39.974, 39.966]
	],
	bore: [[40.036], [40.037]]
};
const byKey = (given: typeof readings) =>
	new Map(resultsOf(jobSheet, sheet, given).map((one) => [one.key, one]));

describe('what follows from a job sheet’s readings', () => {
	it('is the trade’s sums, worked by hand: 0.007 and 0.008; 0.001 and 0.002; 40.037 − 39.966', () => {
		const found = byKey(readings);
		const value = (key: string) => {
			const one = found.get(key);
			return one?.ok ? one.result.valueMm : undefined;
		};
		expect([value('out-of-round'), value('taper'), value('clearance'), value('least')]).toEqual([
			0.008, 0.002, 0.071, 39.966
		]);
	});
	it('carries the uncertainty of both instruments into the clearance', () => {
		const one = byKey(readings).get('clearance');
		// Two rectangular least counts of 0.001 mm and calibrations of 0.002 and 0.003 mm (k = 2), by JCGM 100:2008, 5.1.2.
		const by = 2 * Math.sqrt(2 * (0.001 ** 2 / 12) + 0.001 ** 2 + 0.0015 ** 2);
		expect(one?.ok && one.result.expandedMm).toBeCloseTo(by, 12);
		expect(one?.ok && one.result.ruling.ruling).toBe('too-close');
	});
	it('says what is missing instead of giving a number', () => {
		const found = byKey({
			pin: [
				[39.975, null as unknown as number],
				[39.974, 39.966]
			],
			bore: readings.bore
		});
		expect(found.get('taper')).toMatchObject({ ok: false, because: '1 of 4 readings are missing' });
	});
	it('names a slip of the pen and changes nothing', () => {
		expect(
			slips(jobSheet.grids, {
				pin: [
					[399.75, 39.968],
					[39.974, 39.966]
				]
			})
		).toEqual([
			'Crankpin, front end, in line with the throw: 399.75 mm looks like a slip of the pen.'
		]);
	});
	it('is not complete before every part of it is there', () => {
		expect(missingFrom(jobSheet, emptySubmission, []).length).toBeGreaterThan(5);
	});
	it('keeps a grid in the shape that the job sheet gives it', () => {
		const shapes = { pin: { rows: 2, columns: 2 } };
		const body = applyOperation(
			emptySubmission,
			{ kind: 'reading', grid: 'pin', row: 1, column: 0, valueMm: 39.97 },
			shapes
		);
		expect(body.readings.pin).toEqual([
			[null, null],
			[39.97, null]
		]);
		const outside = applyOperation(
			body,
			{ kind: 'reading', grid: 'pin', row: 5, column: 5, valueMm: 1 },
			shapes
		);
		expect(outside).toEqual(body);
	});
});

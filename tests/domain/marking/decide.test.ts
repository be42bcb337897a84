import { describe, expect, it } from 'vitest';
import { decide, markFaults } from '$lib/domain/marking/decide';
import { markRowSchema } from '$lib/domain/marking/mark';
import { markingSchemeSchema } from '$lib/domain/marking/schema';

const scheme = (mayFallShort: number) =>
	markingSchemeSchema.parse({
		mayFallShort,
		criteria: [
			row('readings', 'Readings', 2),
			row('ruling', 'Ruling', 1),
			row('argument', 'Argument', 2),
			{ ...row('safe-work', 'Safe work', 1), mustPass: true, needsWitness: true }
		]
	});

function row(key: string, title: string, leastLevel: number) {
	const levels = ['none', 'some', 'enough', 'more'];
	return { key, title, outcome: 'an-outcome', levels, leastLevel, redo: `Do ${key} again.` };
}

/** Levels for readings, ruling, argument and safe work. */
function marks(...levels: number[]) {
	return ['readings', 'ruling', 'argument', 'safe-work'].flatMap((criterion, at) => {
		const level = levels[at];
		return level === undefined ? [] : [markRowSchema.parse({ criterion, level })];
	});
}

describe('the decision follows from the levels', () => {
	it('competent: every row at its least level', () => {
		expect(decide(scheme(0), marks(2, 1, 2, 1))).toEqual({
			decision: 'competent',
			because: ['Every row reaches its least level.'],
			redo: []
		});
	});

	it('competent: one row one level short where the scheme allows one, and it is named', () => {
		expect(decide(scheme(1), marks(1, 1, 3, 1))).toEqual({
			decision: 'competent',
			because: ['Readings falls one level short, which the scheme allows; all else stands.'],
			redo: []
		});
	});

	it('not yet: the same row where the scheme allows none', () => {
		expect(decide(scheme(0), marks(1, 1, 3, 1))).toEqual({
			decision: 'not-yet',
			because: ['Every row must reach its least level; Readings does not.'],
			redo: ['Readings: Do readings again.']
		});
	});

	it('not yet: more rows short than the scheme allows', () => {
		const made = decide(scheme(1), marks(1, 0, 2, 1));
		expect(made.because).toEqual(['2 rows fall one level short; the scheme allows 1.']);
		expect(made.redo).toEqual(['Readings: Do readings again.', 'Ruling: Do ruling again.']);
	});

	it('not yet: two levels short is too far, whatever the scheme allows', () => {
		const made = decide(scheme(3), marks(0, 1, 2, 1));
		expect(made.decision).toBe('not-yet');
		expect(made.because).toEqual(['Readings lies more than one level below its least.']);
	});

	it('not yet: nothing makes up for a must-pass row', () => {
		const made = decide(scheme(3), marks(3, 3, 3, 0));
		expect(made.decision).toBe('not-yet');
		expect(made.because).toEqual(['Safe work must pass and does not.']);
		expect(made.redo).toEqual(['Safe work: Do safe-work again.']);
	});

	it('takes a row that was not marked as not reached', () => {
		expect(decide(scheme(0), marks(2, 1, 2)).decision).toBe('not-yet');
	});

	it('never turns competent into not yet when a level is raised', () => {
		const levels = [0, 1, 2, 3];
		for (const allows of [0, 1, 2])
			for (const a of levels)
				for (const b of levels)
					for (const c of levels)
						for (const d of levels) {
							if (decide(scheme(allows), marks(a, b, c, d)).decision === 'not-yet') continue;
							const raised = decide(scheme(allows), marks(Math.min(3, a + 1), b, c, d));
							expect(raised.decision).toBe('competent');
						}
	});
});

describe('what keeps a mark from being signed', () => {
	it('names rows without a level, short rows without words, and a missing witness', () => {
		const rows = [
			markRowSchema.parse({ criterion: 'readings', level: 1 }),
			markRowSchema.parse({ criterion: 'ruling', level: 1 }),
			markRowSchema.parse({ criterion: 'safe-work', level: 1 })
		];
		expect(markFaults(scheme(1), rows)).toEqual([
			'Readings: say in words what was missing.',
			'Argument: choose a level.',
			'Safe work: say who saw it at the bench.'
		]);
	});

	it('finds none in a mark that is whole', () => {
		const rows = marks(2, 1, 2, 1).map((one) =>
			one.criterion === 'safe-work' ? { ...one, witnessId: 'a-person' } : one
		);
		expect(markFaults(scheme(0), rows)).toEqual([]);
	});
});

import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { catalogue } from '$lib/content/catalogue';
import { decide, markFaults } from '$lib/domain/marking/decide';
import type { MarkRow } from '$lib/domain/marking/mark';

const scheme = catalogue()
	.courseByKey('reading-failed-engines')
	?.jobSheets.find((one) => one.key === 'crankpins-and-shells')?.scheme;
if (!scheme) throw new Error('the job sheet is gone');
const least = (over: Record<string, number> = {}): MarkRow[] =>
	scheme.criteria.map((one) => ({
		criterion: one.key,
		level: over[one.key] ?? one.leastLevel,
		words: 'said',
		witnessId: one.needsWitness ? 'w' : null
	}));

describe('the rule of a marking scheme', () => {
	it('finds competent where every row reaches its least level', () => {
		expect(decide(scheme, least())).toEqual({
			decision: 'competent',
			because: ['Every row reaches its least level.'],
			redo: []
		});
	});
	it('lets one row fall one level short where the scheme allows it, and says so', () => {
		const { decision, because } = decide(scheme, least({ evidence: 1 }));
		expect(decision).toBe('competent');
		expect(because[0]).toContain('Evidence falls one level short');
	});
	it('does not where two do, or one by two levels, and names what to redo', () => {
		expect(decide(scheme, least({ evidence: 1, argument: 1 })).decision).toBe('not-yet');
		const far = decide(scheme, least({ readings: 0 }));
		expect(far.decision).toBe('not-yet');
		expect(far.redo).toEqual([expect.stringContaining('Readings: Measure again')]);
	});
	it('lets nothing make up for a must-pass row', () => {
		const best = Object.fromEntries(scheme.criteria.map((one) => [one.key, one.levels.length - 1]));
		expect(decide(scheme, least({ ...best, 'safe-work': 0 })).decision).toBe('not-yet');
	});
	it('never gets worse when a level gets better', () => {
		const levels = fc.tuple(
			...scheme.criteria.map((one) => fc.integer({ min: 0, max: one.levels.length - 1 }))
		);
		fc.assert(
			fc.property(levels, fc.nat(), (given, at) => {
				const rows = least(
					Object.fromEntries(scheme.criteria.map((one, i) => [one.key, given[i] ?? 0]))
				);
				const index = at % rows.length;
				const better = rows.map((row, i) =>
					i === index
						? {
								...row,
								level: Math.min(row.level + 1, (scheme.criteria[i]?.levels.length ?? 1) - 1)
							}
						: row
				);
				if (decide(scheme, rows).decision === 'competent')
					expect(decide(scheme, better).decision).toBe('competent');
			})
		);
	});
	it('cannot be signed without a level, a witness, or words for what is short', () => {
		expect(markFaults(scheme, [])).toHaveLength(scheme.criteria.length);
		expect(
			markFaults(
				scheme,
				least().map((row) => ({ ...row, witnessId: null }))
			)
		).toEqual(['Safe work: say who saw it at the bench.']);
		expect(
			markFaults(
				scheme,
				least({ evidence: 0 }).map((row) => ({ ...row, words: '' }))
			)
		).toEqual(['Evidence: say in words what was missing.']);
		expect(markFaults(scheme, least())).toEqual([]);
	});
});

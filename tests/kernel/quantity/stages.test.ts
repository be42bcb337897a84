import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { parseStages } from '$lib/kernel/quantity/parse-stages';
import { readNumber } from '$lib/kernel/quantity/read-number';

describe('a typed tightening plan', () => {
	it.each([
		['35 Nm + 90°', [{ torqueNm: 35 }, { angleDeg: 90 }]],
		['20 Nm, 40 Nm, 90°', [{ torqueNm: 20 }, { torqueNm: 40 }, { angleDeg: 90 }]],
		['30 N·m then 90 deg then 90 deg', [{ torqueNm: 30 }, { angleDeg: 90 }, { angleDeg: 90 }]],
		['0,5 kgf·m; 1/4 turn', [{ torqueNm: 4.903325 }, { angleDeg: 90 }]]
	])('%s is read', (typed, wanted) => {
		expect(parseStages(typed)).toEqual({ ok: true, value: wanted });
	});
	it('takes a bare figure as a torque only where the field says its unit', () => {
		expect(parseStages('25, 50', 'N·m')).toEqual({
			ok: true,
			value: [{ torqueNm: 25 }, { torqueNm: 50 }]
		});
		const bare = parseStages('25 + 90');
		expect(bare.ok ? '' : bare.because).toBe('stage 1, “25”: say N·m, lbf·ft or degrees as well');
	});
	it.each([
		['', 'no stage'],
		['35 Nm + tight', 'stage 2'],
		['0 Nm', 'above zero'],
		['-90°', 'above zero'],
		[Array(13).fill('10 Nm').join(' + '), 'no plan has more']
	])('%s is refused with the reason', (typed, because) => {
		const found = parseStages(typed);
		expect(found.ok ? '' : found.because).toContain(because);
	});
	it('comes back from what it prints', () => {
		const stage = fc.oneof(
			fc.integer({ min: 1, max: 400 }).map((torqueNm) => ({ torqueNm })),
			fc.integer({ min: 1, max: 360 }).map((angleDeg) => ({ angleDeg }))
		);
		fc.assert(
			fc.property(fc.array(stage, { minLength: 1, maxLength: 6 }), (stages) => {
				const printed = stages
					.map((one) => ('torqueNm' in one ? `${one.torqueNm} N·m` : `${one.angleDeg}°`))
					.join(' + ');
				expect(parseStages(printed)).toEqual({ ok: true, value: stages });
			})
		);
	});
});

describe('a bare figure', () => {
	it('is one number or a reason: what two people would read differently is refused', () => {
		expect(readNumber('1.234,5').ok).toBe(false);
		expect(readNumber('1,250', 'N').ok).toBe(false);
		expect(readNumber('1,250', 'mm')).toEqual({ ok: true, value: 1.25 });
		expect(readNumber('1 250,5')).toEqual({ ok: true, value: 1250.5 });
		expect(readNumber('40 N').ok).toBe(false);
	});
});

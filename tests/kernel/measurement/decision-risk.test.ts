import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { conformanceProbability, ruledWithProbability } from '$lib/kernel/measurement/conformance';
import { decisionRisk } from '$lib/kernel/measurement/decision-risk';
import { knownAfter } from '$lib/kernel/measurement/known-before';
import { guardBandForRisk, riskAtGuardBand } from '$lib/kernel/measurement/specific-risk';
import { normalQuantile } from '$lib/kernel/statistics/distributions/normal';
import type { Outcome } from '$lib/kernel/outcome';
import { expectNear, publishedIn } from '../statistics/published';

const value = <T>(outcome: Outcome<T>): T => {
	if (!outcome.ok) throw new Error(outcome.because);
	return outcome.value;
};
type Numbers = Record<string, number>;
const published = publishedIn<{ inputs: never; expected: never }>('decision-risk.json');

describe('conformance_probability_one_and_two_sided', () => {
	const { inputs, expected, tolerance, source } = published(
		'conformance_probability_one_and_two_sided'
	);
	const rows = inputs as { name: string; y: number; u: number; T_L?: number; T_U?: number }[];
	it.each(rows.map((row) => [row.name, row] as const))(`%s (${source})`, (name, row) => {
		const asked = { value: row.y, standardUncertainty: row.u, least: row.T_L, most: row.T_U };
		expectNear(
			value(conformanceProbability(asked)),
			(expected as Numbers)[name] as number,
			tolerance
		);
	});
});

describe('global_risk_resistors', () => {
	const { inputs, expected, tolerance, source } = published('global_risk_resistors');
	const given = inputs as Numbers & Record<'T_L' | 'T_U' | 'A_L' | 'A_U', number>;
	const wanted = expected as Record<string, Numbers> & { guard_band_sweep: Numbers[] };
	const risk = (least: number, most: number) =>
		value(
			decisionRisk({
				before: { mean: given.prior_mean as number, standard: given.prior_sd as number },
				standardUncertainty: given.u_measurement as number,
				tolerance: { least: given.T_L, most: given.T_U },
				acceptance: { least, most }
			})
		);
	it.each([
		['with_acceptance_interval', given.A_L, given.A_U],
		['simple_acceptance', given.T_L, given.T_U]
	] as const)(`%s (${source})`, (name, least, most) => {
		const found = risk(least, most);
		const pairs: [number | undefined, string][] = [
			[found.conforming, 'p_conforming'],
			[found.accepted, 'p_accepted'],
			[found.consumer, 'R_C_global_consumer'],
			[found.producer, 'R_P_global_producer'],
			[found.falseAccept, 'conditional_false_accept'],
			[found.falseReject, 'conditional_false_reject']
		];
		for (const [one, key] of pairs)
			expectNear(one ?? Number.NaN, wanted[name]?.[key] as number, tolerance);
		// What is accepted is what conforms, less the good ones refused, and the bad ones passed.
		expect(found.accepted).toBeCloseTo(found.conforming - found.producer + found.consumer, 12);
	});
	it.each(wanted.guard_band_sweep.map((row) => [row.guard_band_w as number, row] as const))(
		`guard band %s (${source})`,
		(w, row) => {
			const found = risk(given.T_L + w, given.T_U - w);
			expectNear(found.consumer, row.R_C_global_consumer as number, tolerance);
			expectNear(found.producer, row.R_P_global_producer as number, tolerance);
			expectNear(found.accepted, row.p_accepted as number, tolerance);
		}
	);
});

describe('false_accept_reject_deaver', () => {
	const { expected, tolerance, source } = published('false_accept_reject_deaver');
	const rows = expected as (Numbers & Record<'SL' | 'TUR' | 'GB' | 'PFA' | 'PFR', number>)[];
	it.each(rows.map((row) => [row.SL, row.TUR, row.GB, row] as const))(
		`limits ± %s, ratio %s, acceptance × %s (${source})`,
		(limit, ratio, band, row) => {
			const found = value(
				decisionRisk({
					before: { mean: 0, standard: 1 },
					standardUncertainty: 1 / ratio,
					tolerance: { least: -limit, most: limit },
					acceptance: { least: -limit * band, most: limit * band }
				})
			);
			expectNear(found.consumer, row.PFA, tolerance);
			expectNear(found.producer, row.PFR, tolerance);
		}
	);
});

describe('false_accept_rp19_table', () => {
	const { inputs, expected, tolerance, source } = published('false_accept_rp19_table');
	const given = inputs as {
		in_tolerance_probability: number[];
		sd_ratio_process_over_test: number;
	};
	const wanted = expected as Record<string, number[]>;
	it.each(given.in_tolerance_probability.map((p, at) => [p, at] as const))(
		`%s of the parts within (${source})`,
		(p, at) => {
			const standard = 1 / normalQuantile((1 + p) / 2);
			const limits = { least: -1, most: 1 };
			const found = value(
				decisionRisk({
					before: { mean: 0, standard },
					standardUncertainty: standard / given.sd_ratio_process_over_test,
					tolerance: limits,
					acceptance: limits
				})
			);
			expectNear(
				100 * found.consumer,
				wanted.unconditional_false_accept_percent?.[at] as number,
				tolerance
			);
			expectNear(
				100 * (found.falseAccept ?? Number.NaN),
				wanted.conditional_false_accept_percent?.[at] as number,
				tolerance
			);
		}
	);
});

describe('guard_band_for_specific_risk', () => {
	const { inputs, expected, tolerance, source } = published('guard_band_for_specific_risk');
	const risks = (inputs as Record<string, number[]>).max_specific_consumer_risk as number[];
	const wanted = expected as Record<string, number[]> & { risk_at_w: Record<string, number[]> };
	it.each(risks.map((risk, at) => [risk, at] as const))(`risk %s (${source})`, (risk, at) => {
		const g = guardBandForRisk(risk);
		expectNear(g, wanted.g_multiplier_of_u?.[at] as number, tolerance);
		expectNear(g / 2, wanted.r_multiplier_of_U_k2?.[at] as number, tolerance);
	});
	const bands = wanted.risk_at_w.w_over_U as number[];
	it.each(bands.map((w, at) => [w, at] as const))(`w = %s U (${source})`, (w, at) => {
		const risk = wanted.risk_at_w.false_accept_risk_at_acceptance_limit?.[at] as number;
		expectNear(riskAtGuardBand(w), risk, tolerance);
		// A risk of one in a billion would pass any absolute tolerance.
		expectNear(riskAtGuardBand(w), risk, { rel: 1e-10 });
	});
});

describe('normal_prior_posterior', () => {
	const { inputs, expected, tolerance, source } = published('normal_prior_posterior');
	it(`a reading of a part whose kind is known (${source})`, () => {
		const {
			prior_mean = NaN,
			prior_sd = NaN,
			u_measurement = NaN,
			y = NaN,
			T_U
		} = inputs as Numbers;
		const wanted = expected as Numbers;
		const before = { mean: prior_mean, standard: prior_sd };
		const after = value(knownAfter(before, { mean: y, standard: u_measurement }));
		expectNear(after.mean, wanted.posterior_mean as number, tolerance);
		expectNear(after.standard, wanted.posterior_sd as number, tolerance);
		const probability = (mean: number, standardUncertainty: number) =>
			value(conformanceProbability({ value: mean, standardUncertainty, most: T_U }));
		expectNear(
			probability(after.mean, after.standard),
			wanted.p_conform_with_prior as number,
			tolerance
		);
		expectNear(probability(y, u_measurement), wanted.p_conform_flat_prior as number, tolerance);
	});
});

const size = fc.integer({ min: -500, max: 500 }).map((one) => one / 1000);
const small = fc.integer({ min: 1, max: 100 }).map((one) => one / 1000);

describe('probability of conformance', () => {
	it('lies between 0 and 1, and with its complements makes one', () => {
		fc.assert(
			fc.property(size, small, size, small, (y, u, least, width) => {
				const most = least + width;
				const of = (limits: { least?: number; most?: number }) =>
					value(conformanceProbability({ value: y, standardUncertainty: u, ...limits }));
				const [within, below, above] = [
					of({ least, most }),
					of({ most: least }),
					of({ least: most })
				];
				expect(within).toBeGreaterThanOrEqual(0);
				expect(within).toBeLessThanOrEqual(1);
				expect(within + below + above).toBeCloseTo(1, 12);
			})
		);
	});
	it('is the same in micrometres and seen from below', () => {
		fc.assert(
			fc.property(size, small, size, (y, u, most) => {
				const one = value(conformanceProbability({ value: y, standardUncertainty: u, most }));
				const large = { value: 1000 * y, standardUncertainty: 1000 * u, most: 1000 * most };
				expect(value(conformanceProbability(large))).toBeCloseTo(one, 10);
				const turned = { value: -y, standardUncertainty: u, least: -most };
				expect(value(conformanceProbability(turned))).toBeCloseTo(one, 12);
			})
		);
	});
	it('falls as a reading moves out, and is one half on a limit', () => {
		fc.assert(
			fc.property(size, small, small, size, (y, step, u, most) => {
				const at = (one: number) =>
					value(conformanceProbability({ value: one, standardUncertainty: u, most }));
				expect(at(y + step)).toBeLessThanOrEqual(at(y));
				expect(at(most)).toBe(0.5);
			})
		);
	});
	it('is certain for a value known exactly', () => {
		const at = (one: number) =>
			value(conformanceProbability({ value: one, standardUncertainty: 0, least: 1, most: 2 }));
		expect([at(0.999), at(1), at(2), at(2.001)]).toEqual([0, 1, 1, 0]);
	});
	it('agrees with the ruling that it stands beside', () => {
		fc.assert(
			fc.property(size, small, size, (reading, U, most) => {
				const found = value(
					ruledWithProbability({ question: 'build', value: reading, expandedUncertainty: U, most })
				);
				if (found.ruling === 'within') expect(found.conformance).toBeGreaterThan(0.977);
				if (found.ruling === 'out') expect(found.conformance).toBeLessThan(0.023);
			})
		);
		expect(
			ruledWithProbability({ question: 'build', value: 1, expandedUncertainty: -1, most: 2 }).ok
		).toBe(false);
	});
	it('refuses nonsense', () => {
		const ask = (given: Partial<Parameters<typeof conformanceProbability>[0]>) =>
			conformanceProbability({ value: 1, standardUncertainty: 0.1, most: 2, ...given }).ok;
		expect(ask({})).toBe(true);
		for (const bad of [
			{ value: Number.NaN },
			{ value: Infinity },
			{ standardUncertainty: -1 },
			{ standardUncertainty: Number.NaN },
			{ standardUncertainty: Infinity },
			{ most: undefined },
			{ most: Number.NaN },
			{ most: -Infinity },
			{ least: Infinity },
			{ least: 3 }
		])
			expect(ask(bad)).toBe(false);
	});
});

describe('risk of a way of ruling', () => {
	const asked = fc.record({ mean: size, s: small, u: small, least: size, width: small, w: small });
	const riskOf = (
		{
			mean,
			s,
			u,
			least,
			width
		}: { mean: number; s: number; u: number; least: number; width: number },
		w: number,
		factor = 1
	) =>
		decisionRisk({
			before: { mean: factor * mean, standard: factor * s },
			standardUncertainty: factor * u,
			tolerance: { least: factor * least, most: factor * (least + width) },
			acceptance: { least: factor * (least + w), most: factor * (least + width - w) }
		});
	it('adds up, lies between 0 and 1, and does not hang on the unit', () => {
		fc.assert(
			fc.property(asked, (given) => {
				const found = value(riskOf(given, 0));
				expect(found.accepted).toBeCloseTo(found.conforming - found.producer + found.consumer, 10);
				for (const one of [found.consumer, found.producer, found.accepted, found.conforming]) {
					expect(one).toBeGreaterThanOrEqual(-1e-15);
					expect(one).toBeLessThanOrEqual(1);
				}
				const large = value(riskOf(given, 0, 1000));
				expect(large.consumer).toBeCloseTo(found.consumer, 10);
				expect(large.producer).toBeCloseTo(found.producer, 10);
			})
		);
	});
	it('a guard band passes fewer bad parts and refuses more good ones', () => {
		fc.assert(
			fc.property(asked, (given) => {
				const w = Math.min(given.w, given.width / 2.01);
				const [plain, guarded] = [value(riskOf(given, 0)), value(riskOf(given, w))];
				expect(guarded.consumer).toBeLessThanOrEqual(plain.consumer + 1e-14);
				expect(guarded.producer).toBeGreaterThanOrEqual(plain.producer - 1e-14);
			})
		);
	});
	it('holds for a single limit, a hair of scatter and a very coarse tool', () => {
		const one = (u: number) =>
			value(
				decisionRisk({
					before: { mean: 0, standard: 1 },
					standardUncertainty: u,
					tolerance: { most: 1 },
					acceptance: { most: 1 }
				})
			);
		expect(one(1e-9).consumer).toBeCloseTo(0, 8);
		// A tool that says nothing passes half of all, good and bad alike.
		expect(one(1e9).consumer).toBeCloseTo((1 - one(1).conforming) / 2, 6);
		expect(one(1e9).falseAccept).toBeCloseTo(1 - one(1).conforming, 6);
	});
	it('refuses nonsense', () => {
		const ask = (given: Partial<Parameters<typeof decisionRisk>[0]>) =>
			decisionRisk({
				before: { mean: 0, standard: 1 },
				standardUncertainty: 0.1,
				tolerance: { most: 1 },
				acceptance: { most: 1 },
				...given
			}).ok;
		expect(ask({})).toBe(true);
		for (const bad of [
			{ before: { mean: Number.NaN, standard: 1 } },
			{ before: { mean: 0, standard: 0 } },
			{ standardUncertainty: 0 },
			{ standardUncertainty: Infinity },
			{ tolerance: {} },
			{ tolerance: { least: 2, most: 1 } },
			{ tolerance: { most: Number.NaN } },
			{ acceptance: { least: 2, most: 1 } }
		])
			expect(ask(bad)).toBe(false);
		expect(knownAfter({ mean: 0, standard: 0 }, { mean: 1, standard: 1 }).ok).toBe(false);
		expect(knownAfter({ mean: 0, standard: 1 }, { mean: Number.NaN, standard: 1 }).ok).toBe(false);
		for (const p of [0, 1, Number.NaN]) expect(() => guardBandForRisk(p)).toThrow(RangeError);
		expect(() => riskAtGuardBand(Number.NaN)).toThrow(RangeError);
	});
	it('what is known lies between what was known and what is read, and is known better', () => {
		fc.assert(
			fc.property(size, small, size, small, (m, s, y, u) => {
				const found = value(knownAfter({ mean: m, standard: s }, { mean: y, standard: u }));
				expect(found.mean).toBeGreaterThanOrEqual(Math.min(m, y) - 1e-12);
				expect(found.mean).toBeLessThanOrEqual(Math.max(m, y) + 1e-12);
				expect(found.standard).toBeLessThan(Math.min(s, u));
			})
		);
	});
});

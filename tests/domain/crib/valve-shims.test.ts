import { describe, expect, it } from 'vitest';
import { catalogue } from '$lib/content/catalogue';
import { valveShims } from '$lib/domain/crib/calculators/valve-shims';
import { dataSheetSchema } from '$lib/domain/data-sheets/schema';
import { figureOf, refusalOf, workedOf } from './typed';

const one = { box: '', to: '4.00' };

describe('valve shims', () => {
	it('works its example without buying, and every lash within its limits', () => {
		const worked = workedOf(valveShims);
		expect(figureOf(worked, 'bought')).toBe(0);
		expect(worked.lines[0]).toMatchObject({ key: 'buy', text: 'nothing' });
		for (const step of worked.working.slice(0, -1)) {
			const [, least = '', most = ''] = /limits ([\d.]+) to ([\d.]+) mm/.exec(step.words) ?? [];
			expect(step.value).toBeGreaterThanOrEqual(Number(least) - 1e-9);
			expect(step.value).toBeLessThanOrEqual(Number(most) + 1e-9);
		}
	});
	it('buys where what is right must keep its shim', () => {
		const two = { valves: 'I1_in_2.48_0.22*I2_in_2.40_0.27', box: '2.52' };
		expect(figureOf(workedOf(valveShims, two), 'bought')).toBe(0);
		expect(figureOf(workedOf(valveShims, { ...two, within: 'stays' }), 'bought')).toBe(1);
	});
	it.each([
		['S01', '2.95', '0.35', '0.20', '3.10'],
		['S02', '2.80', '0.10', '0.20', '2.70'],
		['S03', '2.95', '0.47', '0.27', '3.15'],
		['S05', '2.50', '0.32', '0.40', '2.42']
	])(
		'%s a shim of %s mm with %s mm of lash, wanted %s: %s mm (shop rule)',
		(_, shim, lash, wanted, size) => {
			const exact = Number(wanted);
			const worked = workedOf(valveShims, {
				...one,
				valves: `V1_in_${shim}_${lash}`,
				inletLeast: String(exact - 0.005),
				inletMost: String(exact + 0.005),
				step: '0.01'
			});
			expect(worked.lines[0]).toMatchObject({ text: `1 of ${size} mm` });
		}
	);
	it('says which valve cannot be served, and what is missing', () => {
		const far = 'I1_in_2.50_0.20*E1_ex_2.90_0.90';
		expect(refusalOf(valveShims, { ...one, to: '3.00', valves: far })).toContain('E1');
		expect(refusalOf(valveShims, { valves: 'V1_inner_2.50_0.20*V2_x_2.50_0.2' })).toContain(
			'V2: write in or ex'
		);
		expect(refusalOf(valveShims, { inletLeast: '' })).toContain('I1: give the least');
		expect(refusalOf(valveShims, { valves: 'V1_in_2.50_0' })).toContain('V1: a valve without lash');
		expect(refusalOf(valveShims, { step: '0.03' })).toContain('whole number of steps');
	});
	it('takes lashes from a data sheet, and the shims that it lists', () => {
		const sheet = catalogue().engines.find((engine) => engine.key === 'av3-1150');
		if (!sheet) throw new Error('the data sheet is gone');
		const lashes = {
			inletLeast: '0.18',
			inletMost: '0.22',
			exhaustLeast: '0.28',
			exhaustMost: '0.32'
		};
		expect(valveShims.presets?.({ ...sheet, shims: [] })).toEqual([
			{ key: 'valve.lash', words: 'Valve lash, cold', values: lashes }
		]);
		const listed = dataSheetSchema.parse({
			...sheet,
			shims: [
				{
					key: 'valve.shim',
					words: 'Shims under the bucket',
					fromMm: 2,
					toMm: 3,
					stepMm: 0.05,
					source: 'invented'
				}
			]
		});
		expect(valveShims.presets?.(listed)).toEqual([
			{
				key: 'valve.shim',
				words: 'Valve lash, cold, and shims under the bucket',
				values: { ...lashes, from: '2', to: '3', step: '0.05' }
			}
		]);
	});
});

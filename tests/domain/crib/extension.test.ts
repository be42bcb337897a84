import { describe, expect, it } from 'vitest';
import { catalogue } from '$lib/content/catalogue';
import { extension } from '$lib/domain/crib/calculators/extension';
import { expectWithin, given, referenceOf, type Worked } from '../../support/reference';
import { figureOf, refusalOf, typed, workedOf } from './typed';

const published = referenceOf<Worked>('torque-wrench-levers.json');
const only = (shape: RegExp) => published.filter(([, { id }]) => shape.test(id));
const plain = { drag: '', fullScale: '' };
/** An inch-pound is N·m by NIST SP 811; the page works in metric and the figure must come back. */
const poundInch = 0.1129848290276167;

describe('a wrench with an extension', () => {
	it.each(only(/^X1[0-6]/))('%s', (_, entry) => {
		const worked = workedOf(extension, {
			...plain,
			torque: String(given(entry, 'Ta')),
			lever: String(given(entry, 'L')),
			reach: String(given(entry, 'E')),
			angle: String(given(entry, 'a'))
		});
		expectWithin(figureOf(worked, 'setting'), entry);
	});
	it.each(only(/^X0[1-3]/))('%s, typed in inches', (_, entry) => {
		const worked = workedOf(
			extension,
			{
				...plain,
				torque: `${given(entry, 'Ta')} lbf·in`,
				lever: `${given(entry, 'L')} in`,
				reach: `${given(entry, 'E')} in`,
				angle: '0'
			},
			'inch'
		);
		expectWithin(figureOf(worked, 'setting') / poundInch, entry);
	});
	it.each(only(/^X2[01]/))('%s', (_, entry) => {
		const worked = workedOf(extension, {
			...plain,
			torque: String(entry.inputs.Tw ?? 50),
			lever: String(given(entry, 'L')),
			reach: String(given(entry, 'E')),
			angle: '0'
		});
		expectWithin(figureOf(worked, entry.id === 'X20' ? 'arrives' : 'error'), entry);
	});
	it('adds what a self-locking nut drags before it divides', () => {
		// FAA AC 43.13-1B, 7-40 c-d (reference X22: 50 and 8 are 58), then straight on at 400 and 100 mm.
		const worked = workedOf(extension, { ...plain, torque: '50', drag: '8', angle: '0' });
		expect(worked.working[0]).toMatchObject({ value: 58, unit: 'N·m' });
		expect(figureOf(worked, 'setting')).toBeCloseTo((58 * 400) / 500, 9);
	});
	it('says where on its scale the wrench works, and when that is no good', () => {
		const at = (fullScale: string) => workedOf(extension, { angle: '90', fullScale });
		expect(figureOf(at('200'), 'share')).toBeCloseTo(40, 9);
		expect(at('200').notes?.join(' ')).not.toContain('scale');
		expect(at('500').notes?.join(' ')).toContain('no accuracy is stated');
		expect(at('320').notes?.join(' ')).toContain('at its best between 30 and 80 %');
		expect(at('90').notes?.join(' ')).toContain('at its best');
		expect(refusalOf(extension, { angle: '90', fullScale: '79' })).toContain('take a larger one');
	});
	it('refuses a lever that reaches back to the hand, and figures without sense', () => {
		expect(refusalOf(extension, { reach: '400', angle: '180' })).toContain('no lever left');
		for (const [key, text] of [
			['torque', '0'],
			['lever', '-400'],
			['reach', 'long'],
			['angle', '361'],
			['drag', '-1']
		] as const)
			expect(Object.keys(typed(extension, { [key]: text }).faults)).toEqual([key]);
	});
	it('takes the last torque of a data sheet’s bolt', () => {
		const sheet = catalogue().engines.find((one) => one.key === 'av3-1150');
		if (!sheet) throw new Error('the data sheet is gone');
		const taken = extension.presets?.(sheet) ?? [];
		expect(taken.map(({ key }) => key)).toContain('head.bolt');
		const bolt = sheet.fasteners.find((one) => one.key === 'head.bolt');
		const torques = bolt?.stages.flatMap((one) => ('torqueNm' in one ? [one.torqueNm] : []));
		expect(taken.find(({ key }) => key === 'head.bolt')?.values).toEqual({
			torque: String(torques?.at(-1))
		});
	});
});

import { z } from 'zod';
import { cannot, computed } from '$lib/kernel/outcome';
import { shellChoice } from '../../crib/calculators/shell-choice';
import { sheetKeySchema } from '../words';
import { shown } from './draw-reading';
import { sumOf } from './from-calculator';

export const shellClearanceParameters = z.strictObject({
	housing: sheetKeySchema,
	wall: sheetKeySchema,
	pin: sheetKeySchema,
	clearance: sheetKeySchema
});

/**
 * The clearance that new shells will give, before anything is bolted together. Housing, wall and
 * pin are drawn within their build limits and shown in thousandths; drawn again until the clearance
 * lies within its own.
 */
export const shellClearance = sumOf({
	calculator: shellChoice,
	parameters: shellClearanceParameters,
	sheetKeys: ({ housing, wall, pin, clearance }) => [housing, wall, pin, clearance],
	draw({ housing, wall, pin, clearance }, random, sheet) {
		const found = [housing, wall, pin, clearance].map((key) => sheet.figure(key));
		const limits: { words: string; least: number; most: number }[] = [];
		for (const one of found) {
			if (!one.ok) return one;
			const { words, least, most } = one.value;
			if (least === undefined || most === undefined)
				return cannot(`${words} has no limits in the data sheet`);
			limits.push({ words, least, most });
		}
		const [house, shell, journal, film] = limits;
		if (!house || !shell || !journal || !film) return cannot('the data sheet lacks a size');
		for (let tries = 0; tries < 100; tries++) {
			const [h = 0, w = 0, d = 0] = [house, shell, journal].map((one) =>
				shown(random.between(one.least, one.most), 3)
			);
			const values = {
				housing: h,
				pin: d,
				shells: [{ name: 'the new shells', wall: w }],
				least: film.least,
				most: film.most,
				uncertainty: undefined
			};
			const worked = shellChoice.work(values);
			if (!worked.ok || !worked.value.lines.some((one) => one.key === 'clearance')) continue;
			const mm = { unit: 'mm', decimals: 3 };
			return computed({
				values,
				ask: 'clearance',
				given: [
					{ words: house.words, value: h, ...mm },
					{ words: shell.words, value: w, ...mm },
					{ words: journal.words, value: d, ...mm }
				],
				prompt:
					'New shells are to be fitted. From these readings, which oil clearance will they give?'
			});
		}
		return cannot('these sizes give no clearance within its limits');
	}
});

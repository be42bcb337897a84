import { cannot, computed } from '$lib/kernel/outcome';
import type { SheetFigures } from '../questions/sheet-figures';
import { nutFactorOf } from './nut-factors';
import type { DataSheet } from './schema';
import { dimensionOf, fastenerOf, patternOf } from './value-of';
import { unitWords } from './unit-words';

/** One revision of a data sheet as questions ask of it. */
export function figuresOf(sheet: DataSheet): SheetFigures {
	return {
		title: `${sheet.code}, revision ${sheet.revision}`,
		figure(key) {
			const found = dimensionOf(sheet, key);
			if (!found) return cannot(`the data sheet ${sheet.code} has no ${key}`);
			const { least, most } = found.runAgain ?? {};
			return computed({
				key,
				words: found.words,
				unit: unitWords[found.unit],
				decimals: found.decimals,
				nominal: found.nominal,
				least: found.build?.least,
				most: found.build?.most,
				wearLimit: most ?? least,
				wearsBy: most !== undefined ? 'growing' : least !== undefined ? 'shrinking' : undefined
			});
		},
		pattern(key) {
			const found = patternOf(sheet, key);
			return found
				? computed({
						key,
						words: found.words,
						bolts: found.bolts,
						printedOrder: found.printedOrder
					})
				: cannot(`the data sheet ${sheet.code} has no pattern ${key}`);
		},
		tightening(key) {
			const found = fastenerOf(sheet, key);
			if (!found) return cannot(`the data sheet ${sheet.code} has no fastener ${key}`);
			return computed({
				key,
				words: found.words,
				stages: found.stages.map((stage) =>
					'torqueNm' in stage
						? { kind: 'torque' as const, torqueNm: stage.torqueNm }
						: { kind: 'angle' as const, angleDeg: stage.angleDeg }
				),
				threadDiameterMm: found.thread.diameterMm,
				threadPitchMm: found.thread.pitchMm,
				propertyClass: found.propertyClass,
				nutFactor: nutFactorOf(found),
				gripMm: found.gripMm,
				singleUse: found.yieldTightened || /new each time/i.test(found.reuse)
			});
		},
		steps(key) {
			const found = sheet.oversizes.find((one) => one.key === key);
			return found
				? computed({ key, words: found.words, stepsMm: found.stepsMm })
				: cannot(`the data sheet ${sheet.code} has no oversizes ${key}`);
		}
	};
}

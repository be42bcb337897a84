import { displacementCm3 } from '$lib/kernel/cylinder/displacement';
import { meanPistonSpeedMPerS } from '$lib/kernel/cylinder/speed-and-power';
import { computed } from '$lib/kernel/outcome';
import type { Step } from '../../working';
import { calculator, type Preset } from '../calculator';
import { number, quantity } from '../field';
import type { ResultLine } from '../worked';
import { boreRange, length, middleNumber, middleOf, stated, strokeRange } from './cylinder/faces';
import { figure, plain } from './formula-figures';

/** What an engine sweeps, and how fast its pistons go. */
export const displacement = calculator({
	key: 'displacement',
	title: 'Displacement and piston speed',
	says: 'What an engine sweeps from bore, stroke and number of cylinders, and how fast its pistons go.',
	drawer: 'cylinder',
	caution:
		'Take the bore as it is now, after machining. A speed above the maker’s own stretches rods and bolts with its square.',
	formulas: ['cylinder/displacement', 'cylinder/mean-piston-speed'],
	fields: {
		bore: quantity({ ...length, ...boreRange, words: 'Bore', example: '74' }),
		stroke: quantity({ ...length, ...strokeRange, words: 'Stroke', example: '89.1' }),
		cylinders: number({
			words: 'Cylinders',
			whole: true,
			least: 1,
			most: 32,
			initial: '1',
			example: '3'
		}),
		speed: number({
			words: 'Crank speed, revolutions a minute',
			hint: 'With it, the mean speed of the pistons.',
			least: 0,
			most: 30_000,
			optional: true,
			example: '5200'
		})
	},
	work({ bore, stroke, cylinders, speed }) {
		const one = displacementCm3(bore, stroke);
		const all = displacementCm3(bore, stroke, cylinders);
		const mean = speed === undefined ? undefined : meanPistonSpeedMPerS(stroke, speed);
		if (mean && !mean.ok) return mean;
		const cm3 = { unit: 'cm³', decimals: 1 };
		const metres = { unit: 'm/s', decimals: 2 };
		const lines: ResultLine[] = [
			{ key: 'all', words: 'Displacement', value: all, ...cm3, main: true },
			...(cylinders > 1 ? [{ key: 'one', words: 'One cylinder', value: one, ...cm3 }] : []),
			...(mean
				? [{ key: 'speed', words: 'Mean piston speed', value: mean.value, ...metres, main: true }]
				: [])
		];
		const working: Step[] = [
			{
				words: 'One cylinder: area of the bore times stroke, both in cm',
				rule: 'V1 = π/4 · B² · S',
				formula: `π/4 · ${plain(bore / 10)}² · ${plain(stroke / 10)}`,
				value: one,
				...cm3
			},
			...(cylinders > 1
				? [
						{
							words: 'All of them',
							rule: 'V = n · V1',
							formula: `${cylinders} · ${figure(one)}`,
							value: all,
							...cm3
						}
					]
				: []),
			...(mean
				? [
						{
							words: 'Two strokes a turn; millimetres a minute over 60 000 are metres a second',
							rule: 'v = 2 · S · n / 60 000',
							formula: `2 · ${plain(stroke)} · ${plain(speed ?? 0)} / 60 000`,
							value: mean.value,
							...metres
						}
					]
				: [])
		];
		return computed({
			lines,
			working,
			drawing: { kind: 'bore-and-stroke', boreMm: bore, strokeMm: stroke, sweptCm3: one, cylinders }
		});
	},
	presets(sheet) {
		const values = stated({
			bore: middleOf(sheet, 'cylinder.bore'),
			stroke: middleOf(sheet, 'crankshaft.stroke'),
			cylinders: sheet.layout && String(sheet.layout.cylinders)
		});
		const bore = middleNumber(sheet, 'cylinder.bore');
		if (bore === undefined || !values.stroke) return [];
		const over: Preset[] = sheet.oversizes
			.filter((one) => one.of === 'cylinder.bore' && one.kind === 'oversize')
			.flatMap(({ key, stepsMm }) =>
				stepsMm.map((step) => ({
					key: `${key} ${step}`,
					words: `Engine bored ${step} mm over`,
					values: { ...values, bore: String(Number((bore + step).toFixed(4))) }
				}))
			);
		return [{ key: 'cylinder.bore', words: 'Engine as built', values }, ...over];
	}
});

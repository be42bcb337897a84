import { marksAround, type ScaleMark } from '$lib/kernel/geometry/gauging-thread';
import type { Step } from '../../../working';
import { figure } from '../formula-figures';
import { mm } from './faces';

/** A width read off the pack's scale, so that it can be looked up again. */
export function scaleStep(
	place: string,
	scale: readonly ScaleMark[],
	widthMm: number,
	valueMm: number
): Step {
	const [low, high] = marksAround(scale, widthMm) ?? [];
	const width = (one: number) => figure(one, 2);
	if (!low || !high || low === high)
		return {
			words: `${place}, ${width(widthMm)} mm wide: a mark of the scale`,
			value: valueMm,
			...mm
		};
	return {
		words: `${place}, ${width(widthMm)} mm wide: between the marks of ${width(low.widthMm)} and ${width(high.widthMm)} mm`,
		rule: 'c = c1 + (c2 − c1) · (w − w1) / (w2 − w1)',
		formula: `${figure(low.clearanceMm)} + (${figure(high.clearanceMm)} − ${figure(low.clearanceMm)}) · (${width(widthMm)} − ${width(low.widthMm)}) / (${width(high.widthMm)} − ${width(low.widthMm)})`,
		value: valueMm,
		...mm
	};
}

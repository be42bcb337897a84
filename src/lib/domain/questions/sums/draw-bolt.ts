import { cannot, computed, type Outcome } from '$lib/kernel/outcome';
import type { Random } from '$lib/kernel/random/random';
import type { SheetTightening } from '../sheet-figures';
import { shown } from './draw-reading';

/** A nut factor that the bolt's lubrication may give, to a hundredth. */
export function drawFactor({ nutFactor }: SheetTightening, random: Random): number {
	const [least, most] = [nutFactor.least, nutFactor.most].map((one) => Math.round(one * 100));
	return shown(random.integer(least ?? 0, most ?? 0) / 100, 2);
}

/** The last torque of a tightening, before its angles. */
export function finalTorqueOf({ stages, words }: SheetTightening): Outcome<number> {
	const last = stages.filter((stage) => stage.kind === 'torque').at(-1);
	return last?.kind === 'torque' ? computed(last.torqueNm) : cannot(`${words} has no torque stage`);
}

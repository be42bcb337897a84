import { cycleDeg, type Cycle, type Firing } from '$lib/kernel/cylinder/firing';
import { cannot, computed, type Outcome } from '$lib/kernel/outcome';
import type { Step } from '../../../working';

/** "1-3-4-2", "1 3 4 2" or "1, 3, 4, 2" as numbers. */
export function orderTyped(typed: string): Outcome<number[]> {
	const written = typed.split(/[\s,;\u2010-\u2015-]+/).filter(Boolean);
	const odd = written.find((one) => !/^\d{1,2}$/.test(one));
	if (odd !== undefined) return cannot(`“${odd}” is no cylinder: write the order as 1-3-4-2`);
	return written.length > 0 ? computed(written.map(Number)) : cannot('no cylinder stands in it');
}

/** With a decimal only where there is one. */
export function inDegrees(value: number): string {
	return `${Number(value.toFixed(1))}°`;
}

/** From each firing to the next, and back to the first. */
export function firingSteps(
	firings: readonly Firing[],
	throws: readonly number[],
	cycle: Cycle
): Step[] {
	const behind = (cylinder: number) => inDegrees(throws[cylinder - 1] ?? 0);
	const [first] = firings;
	if (!first) return [];
	const rest = firings.slice(1).map(({ cylinder, atDeg }, at) => {
		const before = firings[at] ?? first;
		return {
			words: `Cylinder ${cylinder}: the next time that its throw, ${behind(cylinder)} behind, stands at the top`,
			rule: 'φ = φ before + (throw − throw before), at least more than nothing',
			formula: `${inDegrees(before.atDeg)} + ${inDegrees(before.toNextDeg)}`,
			value: atDeg,
			unit: '°',
			decimals: 1
		};
	});
	const last = firings.at(-1) ?? first;
	return [
		...rest,
		{
			words: `Back to cylinder ${first.cylinder}: what is left of the cycle`,
			rule: 'last = cycle − φ',
			formula: `${cycleDeg[cycle]}° − ${inDegrees(last.atDeg)}`,
			value: last.toNextDeg,
			unit: '°',
			decimals: 1
		}
	];
}

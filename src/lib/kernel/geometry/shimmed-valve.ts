import { noGap } from './valve-lash';

/** A valve as it was found, its shim measured with a micrometer, and the limits of its lash, mm. */
export type ShimmedValve = {
	name: string;
	shimMm: number;
	lashMm: number;
	leastMm: number;
	mostMm: number;
};

const mostValves = 64;
const mostInBox = 400;

/** What cam and stem leave for shim and lash together. */
export function spaceMm({ shimMm, lashMm }: ShimmedValve): number {
	return shimMm + lashMm;
}

export function middleMm({ leastMm, mostMm }: ShimmedValve): number {
	return (leastMm + mostMm) / 2;
}

/** Why a plan cannot be made of these, if it cannot. */
export function faultIn(
	valves: readonly ShimmedValve[],
	boxMm: readonly number[]
): string | undefined {
	if (valves.length === 0) return 'no valve is measured yet';
	if (valves.length > mostValves) return `at most ${mostValves} valves go in one plan`;
	if (boxMm.length > mostInBox) return `at most ${mostInBox} loose shims go in one plan`;
	if (new Set(valves.map((one) => one.name)).size < valves.length) return 'a valve is named twice';
	const shim = (one: number) => one > 0 && one <= 100;
	if (!boxMm.every(shim)) return 'a shim in the box has a thickness above zero';
	for (const { name, shimMm, lashMm, leastMm, mostMm } of valves) {
		if (!shim(shimMm)) return `${name}: a shim has a thickness above zero`;
		if (!(lashMm > 0)) return `${name}: ${noGap}`;
		if (!(lashMm <= 5)) return `${name}: no lash is larger than 5 mm`;
		if (!(leastMm >= 0 && mostMm >= leastMm && mostMm <= 5))
			return `${name}: the least lash is zero or more, the most as large or larger`;
	}
	return undefined;
}

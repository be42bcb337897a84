import type { Tightened } from '$lib/kernel/fasteners/torque-angle';
import type { Step } from '../../../working';
import { plain } from '../formula-figures';

/** One bolt that was turned, and what it was reckoned with. */
export type Turned = Tightened & {
	factor: number;
	snugN: number;
	/** Lasting stretch as a share of the length that yields. */
	strain: number;
	neededDeg: number | undefined;
};
type Joint = {
	pitchMm: number;
	boltNPerMm: number;
	jointNPerMm: number;
	bothNPerMm: number;
	yieldN: number;
	diameterMm: number;
	snugNm: number;
	angles: readonly number[];
	travelMm: number;
	hardening: number | undefined;
	/** Length that yields, mm. */
	drawnMm: number;
	wantedKn: number | undefined;
};

const kn = { unit: 'kN', decimals: 1 };
const kilo = (value: number) => (value / 1000).toFixed(1);

/** How the load follows from torque and angle, for the slippery bolt and, after it, for the one that drags. */
export function angleSteps(ends: readonly Turned[], joint: Joint): Step[] {
	const { bothNPerMm, boltNPerMm, jointNPerMm, pitchMm, angles, travelMm } = joint;
	const several = ends.length > 1;
	const names = several ? ['If slippery: ', 'If it drags: '] : [''];
	return [
		{
			words: 'Bolt and parts together',
			rule: 'k = kb · kj / (kb + kj)',
			formula: `${kilo(boltNPerMm)} · ${kilo(jointNPerMm)} / (${kilo(boltNPerMm)} + ${kilo(jointNPerMm)})`,
			value: bothNPerMm / 1000,
			unit: 'kN/mm',
			decimals: 1
		},
		{
			words: 'Way along the thread',
			rule: 's = P · α / 360°',
			formula: `${plain(pitchMm)} · (${angles.map(plain).join(' + ')}) / 360`,
			value: travelMm,
			unit: 'mm',
			decimals: 3
		},
		...ends.flatMap((one, at) => stepsOf(one, joint, names[at] ?? ''))
	];
}

function stepsOf(one: Turned, joint: Joint, name: string): Step[] {
	const { bothNPerMm, pitchMm, yieldN, hardening = 0, travelMm } = joint;
	const led = (words: string) =>
		name ? `${name}${words.charAt(0).toLowerCase()}${words.slice(1)}` : words;
	const both = kilo(bothNPerMm);
	return [
		{
			words: led('Load by the snug torque'),
			rule: 'Fs = T / (K · d)',
			formula: `${plain(joint.snugNm)} / (${plain(one.factor)} · ${plain(joint.diameterMm)})`,
			value: one.snugN / 1000,
			...kn
		},
		{
			words: led('Angle at which it begins to yield'),
			rule: 'αy = 360° · (Fy − Fs) / (k · P)',
			formula: `360 · (${kilo(yieldN)} − ${kilo(one.snugN)}) / (${both} · ${plain(pitchMm)})`,
			value: one.angleAtYieldDeg,
			unit: '°',
			decimals: 0
		},
		...(one.beyondYield
			? pastYield(one, joint, led, hardening)
			: [
					{
						words: led('Load after the angles'),
						rule: 'F = Fs + k · s',
						formula: `${kilo(one.snugN)} + ${both} · ${travelMm.toFixed(3)}`,
						value: one.preloadN / 1000,
						...kn
					}
				]),
		...(one.neededDeg === undefined
			? []
			: [
					{
						words: led('Angle for the wanted preload'),
						rule: 'α = 360° · (F − Fs) / (k · P)',
						formula: `360 · (${plain(joint.wantedKn ?? 0)} − ${kilo(one.snugN)}) / (${both} · ${plain(pitchMm)})`,
						value: one.neededDeg,
						unit: '°',
						decimals: 0
					}
				])
	];
}

function pastYield(
	one: Turned,
	joint: Joint,
	led: (words: string) => string,
	hardening: number
): Step[] {
	const { bothNPerMm, pitchMm, yieldN, drawnMm } = joint;
	const past = `${plain(pitchMm)} · ${one.pastYieldDeg.toFixed(1)} / 360`;
	return [
		hardening === 0
			? { words: led('Past yield the load stays there'), rule: 'F = Fy', formula: kilo(yieldN) }
			: {
					words: led('Load after the angles, past yield'),
					rule: 'F = Fy + h · k · P · (α − αy) / 360°',
					formula: `${kilo(yieldN)} + ${plain(hardening)} / 100 · ${kilo(bothNPerMm)} · ${past}`
				}
	]
		.map((step): Step => ({ ...step, value: one.preloadN / 1000, ...kn }))
		.concat([
			{
				words: led('Drawn for good'),
				rule: hardening === 0 ? 'ΔL = P · (α − αy) / 360°' : 'ΔL = (1 − h) · P · (α − αy) / 360°',
				formula: hardening === 0 ? past : `(1 − ${plain(hardening)} / 100) · ${past}`,
				value: one.lastingMm,
				unit: 'mm',
				decimals: 3
			},
			{
				words: led('as a share of the length that yields'),
				rule: 'ε = ΔL / L',
				formula: `100 · ${one.lastingMm.toFixed(3)} / ${plain(drawnMm)}`,
				value: 100 * one.strain,
				unit: '%',
				decimals: 2
			}
		]);
}

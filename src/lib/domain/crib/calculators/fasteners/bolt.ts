import { pitchOfMm, type BoltThread } from '$lib/kernel/fasteners/bolt-thread';
import { threadLoads, type Loads } from '$lib/kernel/fasteners/proof-load';
import { coarsePitchMm, unifiedThreads } from '$lib/kernel/fasteners/standard-pitches';
import { strengthOf, type Strength, type StrengthName } from '$lib/kernel/fasteners/strength';
import { threadOf, type Thread } from '$lib/kernel/fasteners/thread';
import { cannot, computed, type Outcome } from '$lib/kernel/outcome';
import type { Step } from '../../../working';
import { plain } from '../formula-figures';
import { strengthWords } from './bolt-fields';

export type TypedBolt = {
	diameter: number;
	pitch: number | undefined;
	threads: number | undefined;
	propertyClass: StrengthName;
};
export type Bolt = {
	/** "M10 × 1.25", "1/2-13" */
	name: string;
	thread: BoltThread;
	geometry: Thread;
	strength: Strength;
	loads: Loads;
	/** How the stress area was found. */
	areaSteps: Step[];
};

/** What the fields of a bolt say: its thread, its strength and what it bears. */
export function boltOf(typed: TypedBolt): Outcome<Bolt> {
	const thread = threadOfTyped(typed);
	if (!thread.ok) return thread;
	const geometry = threadOf(typed.diameter, pitchOfMm(thread.value));
	if (!geometry.ok) return geometry;
	const strength = strengthOf(typed.propertyClass, typed.diameter);
	if (!strength.ok) return strength;
	const loads = threadLoads(thread.value, typed.propertyClass);
	if (!loads.ok) return loads;
	return computed({
		name: nameOf(thread.value),
		thread: thread.value,
		geometry: geometry.value,
		strength: strength.value,
		loads: loads.value,
		areaSteps: areaSteps(thread.value, geometry.value, loads.value.areaMm2)
	});
}

function threadOfTyped({ diameter: diameterMm, pitch, threads }: TypedBolt): Outcome<BoltThread> {
	if (pitch !== undefined && threads !== undefined)
		return cannot('fill in the pitch or the threads per inch, one of the two');
	if (threads !== undefined) return computed({ diameterMm, threadsPerInch: threads });
	const pitchMm = pitch ?? coarsePitchMm(diameterMm);
	if (pitchMm !== undefined) return computed({ diameterMm, pitchMm });
	const inch = unifiedThreads(diameterMm / 25.4);
	return inch
		? computed({ diameterMm, threadsPerInch: inch.coarse })
		: cannot('this size has no coarse pitch of its own: fill in its pitch or its threads per inch');
}

function nameOf(thread: BoltThread): string {
	return thread.threadsPerInch === undefined
		? `M${plain(thread.diameterMm)} × ${plain(thread.pitchMm)}`
		: `${inchName(thread.diameterMm / 25.4)}-${plain(thread.threadsPerInch)}`;
}

/** A size in sixteenths as the trade writes it: 1/2, 1 1/4; other sizes as they are. */
function inchName(inches: number): string {
	const sixteenths = Math.round(inches * 16);
	if (Math.abs(inches * 16 - sixteenths) > 1e-6) return plain(inches);
	const whole = Math.floor(sixteenths / 16);
	let [over, under] = [sixteenths % 16, 16];
	while (over > 0 && over % 2 === 0) [over, under] = [over / 2, under / 2];
	if (over === 0) return String(whole);
	return whole === 0 ? `${over}/${under}` : `${whole} ${over}/${under}`;
}

function areaSteps(thread: BoltThread, geometry: Thread, areaMm2: number): Step[] {
	const area = { value: areaMm2, unit: 'mm²', decimals: 1 };
	if (thread.threadsPerInch === undefined)
		return [
			{
				words: 'Stress area, to three figures as the tables have it',
				rule: 'As = π/4 · ((d2 + d3)/2)², d2 = d − 0.649519 P, d3 = d − 1.226869 P',
				formula: `π/4 · ((${geometry.pitchDiameterMm.toFixed(3)} + ${geometry.rootDiameterMm.toFixed(3)})/2)²`,
				...area
			}
		];
	const inches = plain(thread.diameterMm / 25.4);
	return [
		{
			words: 'Stress area in square inches, to four places as the tables have it',
			rule: 'As = 0.7854 · (d − 0.9743/n)²',
			formula: `0.7854 · (${inches} − 0.9743/${plain(thread.threadsPerInch)})²`,
			value: areaMm2 / 25.4 ** 2,
			unit: 'in²',
			decimals: 4
		},
		{
			words: 'The same in square millimetres',
			rule: '1 in² = 645.16 mm²',
			formula: `${(areaMm2 / 25.4 ** 2).toFixed(4)} · 645.16`,
			...area
		}
	];
}

/** What a bolt bears, one step for each load that is named. */
export function loadSteps(
	{ loads, strength }: Bolt,
	named: StrengthName,
	which: readonly ('proof' | 'yield' | 'tensile')[]
): Step[] {
	const steps = {
		proof: { words: 'Proof load', letter: 'Sp', load: loads.proofN, stress: strength.proofMPa },
		yield: { words: 'Load at yield', letter: 'Re', load: loads.yieldN, stress: strength.yieldMPa },
		tensile: {
			words: 'Least tensile load',
			letter: 'Rm',
			load: loads.tensileN,
			stress: strength.tensileMPa
		}
	};
	return which.map((one) => {
		const { words, letter, load, stress } = steps[one];
		return {
			words: `${words}, ${strengthWords(named).replace('Class', 'class')}: ${plain(Number(stress.toFixed(1)))} N/mm²`,
			rule: `F = As · ${letter}`,
			formula: `${plain(loads.areaMm2)} · ${plain(Number(stress.toFixed(1)))} / 1000`,
			value: load / 1000,
			unit: 'kN',
			decimals: 1
		};
	});
}

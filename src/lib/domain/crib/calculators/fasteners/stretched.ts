import { strengthWhileTurned } from '$lib/kernel/fasteners/assembly-preload';
import { boltSections, roundOfAreaMm, weakestSection } from '$lib/kernel/fasteners/bolt-sections';
import { boltStiffnessNPerMm, type Section } from '$lib/kernel/fasteners/stiffness';
import { loadsOf, type Loads } from '$lib/kernel/fasteners/proof-load';
import { yieldLoadN } from '$lib/kernel/fasteners/yield-load';
import { cannot, computed, type Outcome } from '$lib/kernel/outcome';
import type { Step } from '../../../working';
import { plain } from '../formula-figures';
import type { Bolt } from './bolt';

export type TypedStretch = {
	grip: number;
	shankLength: number | undefined;
	shankDiameter: number | undefined;
	threadFriction: number | undefined;
};
export type Stretched = {
	stiffnessNPerMm: number;
	/** Where it yields first: its length is what is drawn for good. */
	weakest: Section;
	/** What its weakest section bears. */
	loads: Loads;
	yieldN: number;
	steps: Step[];
};

/** What of a bolt is stretched between head and thread, how stiff it is, and where it yields. */
export function stretchedOf(bolt: Bolt, typed: TypedStretch): Outcome<Stretched> {
	const { grip, shankLength, shankDiameter, threadFriction } = typed;
	if ((shankLength === undefined) !== (shankDiameter === undefined))
		return cannot('a plain shank wants its length and its diameter, both or neither');
	const shank =
		shankLength === undefined || shankDiameter === undefined
			? undefined
			: { lengthMm: shankLength, diameterMm: shankDiameter };
	const sections = boltSections(grip, bolt.loads.areaMm2, shank);
	if (!sections.ok) return sections;
	const stiffness = boltStiffnessNPerMm(sections.value);
	if (!stiffness.ok) return stiffness;
	const weakest = weakestSection(sections.value);
	if (!weakest.ok) return weakest;
	const loads = loadsOf(weakest.value.areaMm2, bolt.strength);
	if (!loads.ok) return loads;
	const left = strengthLeft(bolt, weakest.value, threadFriction);
	if (!left.ok) return left;
	const { yieldMPa } = bolt.strength;
	const yieldN = yieldLoadN(weakest.value.areaMm2, yieldMPa, left.value);
	if (!yieldN.ok) return yieldN;
	const area = (one: Section) => one.areaMm2.toFixed(1);
	return computed({
		stiffnessNPerMm: stiffness.value,
		weakest: weakest.value,
		loads: loads.value,
		yieldN: yieldN.value,
		steps: [
			{
				words: 'Stiffness of the bolt, its sections one after another',
				rule: 'kb = E / Σ (Li / Ai)',
				formula: `205 / (${sections.value.map((one) => `${plain(one.lengthMm)} / ${area(one)}`).join(' + ')})`,
				value: stiffness.value / 1000,
				unit: 'kN/mm',
				decimals: 1
			},
			...(threadFriction === undefined
				? []
				: [
						{
							words: 'What the twist of tightening leaves of its strength',
							rule: 'q = 1 / √(1 + 3 · (1.5 · d2/d0 · (P/(π · d2) + 1.155 µG))²)',
							value: left.value,
							unit: '',
							decimals: 3
						}
					]),
			{
				words: 'Load at yield of its thinnest section',
				rule: threadFriction === undefined ? 'Fy = A · Re' : 'Fy = q · A · Re',
				formula: `${threadFriction === undefined ? '' : `${left.value.toFixed(3)} · `}${area(weakest.value)} · ${plain(Number(yieldMPa.toFixed(1)))} / 1000`,
				value: yieldN.value / 1000,
				unit: 'kN',
				decimals: 1
			}
		]
	});
}

function strengthLeft(
	{ geometry, loads }: Bolt,
	weakest: Section,
	threadFriction: number | undefined
): Outcome<number> {
	if (threadFriction === undefined) return computed(1);
	const waisted = weakest.areaMm2 < loads.areaMm2;
	return strengthWhileTurned(
		geometry.diameterMm,
		geometry.pitchMm,
		threadFriction,
		waisted ? roundOfAreaMm(weakest.areaMm2) : undefined
	);
}

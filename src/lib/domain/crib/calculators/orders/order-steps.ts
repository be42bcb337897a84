import { isRing, placedBolts, type Bolt } from '$lib/kernel/fasteners/bolt-pattern';
import type { Direction } from '$lib/kernel/fasteners/departure';
import type { Step } from '../../../working';
import { figure } from '../formula-figures';

/** Why an order is sound, bolt by bolt: its distance from the middle, or the crossing of a flange. */
export function orderSteps(
	bolts: readonly Bolt[],
	order: readonly string[],
	direction: Direction,
	isPrinted: boolean
): Step[] {
	if (isPrinted)
		return [
			{
				words:
					direction === 'loosen'
						? 'The printed order wins over any rule; loosening takes it backwards.'
						: 'The printed order wins over any rule.',
				rule: 'as printed',
				formula: order.join(', ')
			}
		];
	const placed = placedBolts(bolts);
	if (!placed.ok) return [];
	if (isRing(placed.value))
		return [
			{
				words: 'All bolts lie at one distance from the middle: a flange, crossed in pairs.',
				rule: 'the farthest from all that was turned, then the one across',
				formula: pairs(order).join('; ')
			}
		];
	const reach = new Map(placed.value.map((one) => [one.id, one.reachMm]));
	return [
		{
			words:
				direction === 'loosen'
					? 'From the outside inwards, at one distance crosswise. Distances from the middle of the pattern, mm:'
					: 'From the middle outwards, at one distance crosswise. Distances from the middle of the pattern, mm:',
			rule: 'r = √((x − mean x)² + (y − mean y)²)',
			formula: order.map((id) => `${id} ${figure(reach.get(id) ?? 0, 1)}`).join(', ')
		}
	];
}

function pairs(order: readonly string[]): string[] {
	return order.flatMap((id, at) =>
		at % 2 === 0 ? [order[at + 1] === undefined ? id : `${id} and ${order[at + 1] ?? ''}`] : []
	);
}

import type { Formula } from '../../../formula';

/** One formula of the handbook, in the order in which a table would hold it. */
export type Line = [
	works: Formula['works'],
	id: string,
	formula: string,
	place: string,
	says: string,
	gives: number,
	wanted: number,
	within: number
];

export function formulaOf([works, id, formula, place, says, gives, wanted, within]: Line): Formula {
	return {
		id: `statistics/${id}`,
		works,
		formula,
		source: `Abramowitz and Stegun, Handbook of Mathematical Functions (1964), ${place}`,
		example: { says, gives: () => gives, wanted, within }
	};
}

import { mean, partMeans, type GaugeStudy } from '$lib/kernel/measurement/gauge-study/study';
import { cannot, computed, type Outcome } from '$lib/kernel/outcome';
import type { GroupStudyDrawing } from '../../drawings/group-study';
import type { TableRow } from '../../field';

export const mostParts = 10;

export type Group = { people: string[]; parts: string[]; study: GaugeStudy };

/** Rows of one name are that person's trials, in the order in which they stand. */
export function groupOf(rows: readonly TableRow[]): Outcome<Group> {
	const people = [...new Set(rows.map(({ person }) => String(person)))];
	const cells = (row: TableRow) =>
		Array.from({ length: mostParts }, (_, at) => row[`part${at + 1}`] ?? null);
	const count = Math.max(0, ...rows.map((row) => cells(row).findLastIndex(isReading) + 1));
	const study: number[][][] = [];
	for (const name of people) {
		const trials: number[][] = [];
		for (const row of rows.filter(({ person }) => String(person) === name)) {
			const readings = cells(row).slice(0, count);
			const gap = readings.findIndex((one) => !isReading(one));
			if (gap >= 0) return cannot(`${name}, part ${gap + 1}: a reading is missing`);
			trials.push(readings.filter(isReading));
		}
		study.push(trials);
	}
	const often = study.map((trials) => trials.length);
	if (new Set(often).size > 1)
		return cannot(
			`everybody measures each part equally often: ${people.map((name, at) => `${name} has ${often[at]}`).join(', ')}`
		);
	const parts = Array.from({ length: count }, (_, at) => `part ${at + 1}`);
	return computed({ people, parts, study });
}

function isReading(one: TableRow[string] | undefined): one is number {
	return typeof one === 'number';
}

/** Each reading as its distance from the mean of its part, so that scatter is seen and not size. */
export function groupDrawing(
	{ people, parts, study }: Group,
	expandedMm: number,
	decimals: number
): GroupStudyDrawing {
	const means = partMeans(study);
	return {
		kind: 'group-study',
		people,
		parts: parts.map((words, part) => ({
			words,
			meanMm: means[part] ?? mean([]),
			distancesMm: study.map((trials) =>
				trials.map((trial) => (trial[part] as number) - (means[part] as number))
			)
		})),
		expandedMm,
		decimals
	};
}

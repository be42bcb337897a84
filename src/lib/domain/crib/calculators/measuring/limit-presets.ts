import type { RulingQuestion } from '$lib/kernel/measurement/ruling';
import type { DataSheet } from '../../../data-sheets/schema';
import { limitsFor } from '../../../data-sheets/value-of';

export type LimitPreset = {
	key: string;
	words: string;
	question: RulingQuestion;
	/** As typed; a limit that the sheet does not have is emptied. */
	limits: { least: string; most: string };
	/** From the build limit to the wear limit, where there is one limit alone: as typed. */
	room: string;
};

/** Every length of a sheet that has limits, once for each question that it can answer. */
export function limitPresets(sheet: DataSheet): LimitPreset[] {
	return sheet.dimensions
		.filter(({ unit }) => unit === 'mm')
		.flatMap((dimension) => {
			const { key, words, build, runAgain, decimals } = dimension;
			const typed = (value: number | undefined) =>
				value === undefined ? '' : value.toFixed(decimals);
			const of = (question: RulingQuestion, said: string) => {
				const { least, most } = limitsFor(dimension, question);
				const room =
					least === undefined && most !== undefined && build
						? most - build.most
						: most === undefined && least !== undefined && build
							? build.least - least
							: undefined;
				return {
					key: `${key}/${question}`,
					words: `${words}, ${said}`,
					question,
					limits: { least: typed(least), most: typed(most) },
					room: typed(room)
				};
			};
			return [
				...(build ? [of('build', 'to build')] : []),
				...(runAgain ? [of('run-again', 'to run again')] : [])
			];
		});
}

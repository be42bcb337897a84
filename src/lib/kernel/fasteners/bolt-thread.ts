import { computedNumber } from '../computed-number';
import { computed, type Outcome } from '../outcome';
import { stressAreaIn2, stressAreaMm2 } from './stress-area';

/** A metric thread by its pitch, or a unified one by its threads per inch. */
export type BoltThread = { diameterMm: number } & (
	{ pitchMm: number; threadsPerInch?: undefined } | { threadsPerInch: number }
);

/** Pitch of either kind of thread, mm. */
export function pitchOfMm(thread: BoltThread): number {
	return thread.threadsPerInch === undefined ? thread.pitchMm : 25.4 / thread.threadsPerInch;
}

/**
 * Stress area of either kind of thread, rounded as the tables of its standard have it.
 *
 * @param thread sizes in mm, or threads per inch
 * @returns mm²; "cannot" for a thread that cannot be cut
 * Source: ISO 898-1:2013, tables 4 to 7 (three figures); ASME B1.1 tables (four places of in²).
 * @example tabledAreaMm2({ diameterMm: 10, pitchMm: 1.25 }) // 61.2
 */
export function tabledAreaMm2(thread: BoltThread): Outcome<number> {
	if (thread.threadsPerInch === undefined) {
		const area = stressAreaMm2(thread.diameterMm, thread.pitchMm);
		return area.ok ? computed(Number(area.value.toPrecision(3))) : area;
	}
	const area = stressAreaIn2(thread.diameterMm / 25.4, thread.threadsPerInch);
	return area.ok ? computedNumber(Number(area.value.toFixed(4)) * 25.4 ** 2) : area;
}

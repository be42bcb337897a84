import { taperMm } from '$lib/kernel/geometry/diameter-grid';
import { ofTwoReadings } from './two-readings';

/** Difference between the two ends of a journal or bore, on the worse axis. */
export const taper = ofTwoReadings({
	places: ['front end', 'rear end'],
	prompt: 'One plane was read at both ends. What is its taper?',
	grid: ([a, b]) => [[a], [b]],
	find: taperMm
});

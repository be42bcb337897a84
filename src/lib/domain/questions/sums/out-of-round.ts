import { outOfRoundMm } from '$lib/kernel/geometry/diameter-grid';
import { ofTwoReadings } from './two-readings';

/** Largest minus smallest of two readings across a journal or bore, at the worst station. */
export const outOfRound = ofTwoReadings({
	places: ['in line with the throw', 'square to it'],
	prompt: 'One end was read in two planes at right angles. How far is it out of round?',
	grid: ([a, b]) => [[a, b]],
	find: outOfRoundMm
});

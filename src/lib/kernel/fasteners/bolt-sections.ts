import { computedNumber } from '../computed-number';
import { cannot, computed, type Outcome } from '../outcome';
import type { Section } from './stiffness';

/**
 * What is stretched of a bolt: its plain shank, where it has one, and the thread beyond.
 *
 * @param gripMm whole length from head to first loaded thread, mm
 * @param threadAreaMm2 stress area of the thread, mm²
 * @param shank length and diameter, mm, no longer than the grip; left out, all of it is thread
 * @returns sections from the head on
 * Source: VDI 2230 part 1, a bolt as sections in series.
 * @example boltSections(95, 61.2, { lengthMm: 60, diameterMm: 10 }) // shank, then 35 mm of thread
 */
export function boltSections(
	gripMm: number,
	threadAreaMm2: number,
	shank?: { lengthMm: number; diameterMm: number }
): Outcome<Section[]> {
	if (!(gripMm > 0) || !(threadAreaMm2 > 0))
		return cannot('length and stress area are numbers above zero');
	if (!shank) return computed([{ lengthMm: gripMm, areaMm2: threadAreaMm2 }]);
	const { lengthMm, diameterMm } = shank;
	if (!(lengthMm > 0) || !(diameterMm > 0))
		return cannot('a shank has a length and a diameter above zero');
	if (lengthMm > gripMm) return cannot('the shank is no longer than what is stretched');
	const area = computedNumber((Math.PI / 4) * diameterMm ** 2);
	if (!area.ok) return area;
	const sections = [{ lengthMm, areaMm2: area.value }];
	if (lengthMm < gripMm) sections.push({ lengthMm: gripMm - lengthMm, areaMm2: threadAreaMm2 });
	return computed(sections);
}

/** The section that yields first: the thinnest, and of equals the first. */
export function weakestSection(sections: readonly Section[]): Outcome<Section> {
	const [first, ...rest] = sections;
	if (!first) return cannot('a bolt has at least one section');
	return computed(rest.reduce((weak, one) => (one.areaMm2 < weak.areaMm2 ? one : weak), first));
}

/** Diameter of a round section, mm. */
export function roundOfAreaMm(areaMm2: number): number {
	return Math.sqrt((4 * areaMm2) / Math.PI);
}

import { computedNumber } from '../../computed-number';
import { cannot, type Outcome } from '../../outcome';
import { areLines } from './lines';

/**
 * Reading of a metric micrometer (screw of 0.5 mm, thimble of 50 lines).
 *
 * Formula: frame + whole mm + 0.5 · half line + 0.01 · thimble line + 0.001 · vernier line.
 * @param shown frameMm: where its range begins; wholeMm on the barrel, 0 to 25; halfLines showing
 * past it, 0 or 1; thimbleLine 0 to 49; vernierLine 0 to 9, left out where there is none
 * @returns mm; "cannot" where a line does not exist
 * Source: US Army TM 9-243, reading a metric micrometer (its 0.05 mm of pitch is a misprint).
 * @example metricMicrometerMm({ wholeMm: 18, halfLines: 1, thimbleLine: 10 }) // 18.60
 */
export function metricMicrometerMm(shown: {
	frameMm?: number;
	wholeMm: number;
	halfLines: number;
	thimbleLine: number;
	vernierLine?: number;
}): Outcome<number> {
	const { frameMm = 0, wholeMm, halfLines, thimbleLine, vernierLine = 0 } = shown;
	if (!(frameMm >= 0)) return cannot('a frame begins at zero or above');
	if (!areLines([wholeMm, 25], [halfLines, 1], [thimbleLine, 49], [vernierLine, 9]))
		return cannot(
			'the barrel shows 0 to 25 mm and one half, the thimble 0 to 49, the vernier 0 to 9'
		);
	return computedNumber(
		frameMm + (1000 * wholeMm + 500 * halfLines + 10 * thimbleLine + vernierLine) / 1000
	);
}

/**
 * Reading of an inch micrometer (screw of 40 to the inch, thimble of 25 lines).
 *
 * Formula: frame + 0.1 · barrel figure + 0.025 · lines + 0.001 · thimble line + 0.0001 · vernier line.
 * @param shown frameIn: where its range begins; barrelFigure 0 to 10; lines past it, 0 to 3;
 * thimbleLine 0 to 24; vernierLine 0 to 9, left out where there is none
 * @returns inches, as its scale is cut; "cannot" where a line does not exist
 * Source: US Navy NAVEDTRA 14001; US Army TM 9-243.
 * @example inchMicrometerIn({ barrelFigure: 4, lines: 2, thimbleLine: 18 }) // 0.468
 */
export function inchMicrometerIn(shown: {
	frameIn?: number;
	barrelFigure: number;
	lines: number;
	thimbleLine: number;
	vernierLine?: number;
}): Outcome<number> {
	const { frameIn = 0, barrelFigure, lines, thimbleLine, vernierLine = 0 } = shown;
	if (!(frameIn >= 0)) return cannot('a frame begins at zero or above');
	if (!areLines([barrelFigure, 10], [lines, 3], [thimbleLine, 24], [vernierLine, 9]))
		return cannot(
			'the barrel shows 0 to 10 and three lines, the thimble 0 to 24, the vernier 0 to 9'
		);
	return computedNumber(
		frameIn + (1000 * barrelFigure + 250 * lines + 10 * thimbleLine + vernierLine) / 10000
	);
}

/**
 * A reading freed of the instrument's error at zero.
 *
 * Formula: size = reading − what it reads when closed, or on its setting standard, less the standard.
 * @param reading as shown @param atZero what it shows where it should show zero, same unit
 * @returns in that unit; "cannot" where one is no number
 * Source: definition; TM 9-243, testing micrometers.
 * @example freedOfZeroError(22.36, 0.02) // 22.34
 */
export function freedOfZeroError(reading: number, atZero: number): Outcome<number> {
	return computedNumber(reading - atZero);
}

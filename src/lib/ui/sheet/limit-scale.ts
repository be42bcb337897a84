type Drawn = {
	at: number;
	bar: { from: number; to: number };
	band?: { from: number; to: number };
	strokes: number[];
};

const left = 6;
const right = 184;

/**
 * Places a reading and its limits on one axis, 190 wide. The axis runs from zero where that keeps
 * the limits legible (clearances), else closely around them (diameters).
 */
export function limitScale(reading: {
	value: number;
	uncertainty: number;
	build?: { least: number; most: number };
	runAgain?: { least?: number; most?: number };
}): Drawn {
	const { value, uncertainty, build, runAgain } = reading;
	const marks = [build?.least, build?.most, runAgain?.least, runAgain?.most].filter(
		(one): one is number => one !== undefined
	);
	const all = [...marks, value - uncertainty, value + uncertainty];
	const [least, most] = [Math.min(...all), Math.max(...all)];
	const span = Math.max(most - least, uncertainty, 1e-9);
	const fromZero = least >= 0 && least < 2 * span;
	const start = fromZero ? 0 : least - span * 0.12;
	const end = most + span * 0.12;
	const x = (one: number) =>
		Math.round((left + ((Math.max(start, one) - start) / (end - start)) * (right - left)) * 100) /
		100;
	return {
		at: x(value),
		bar: { from: x(value - uncertainty), to: x(value + uncertainty) },
		band: build && { from: x(build.least), to: x(build.most) },
		strokes: [runAgain?.least, runAgain?.most]
			.filter((one): one is number => one !== undefined)
			.map(x)
	};
}

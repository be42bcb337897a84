import { cannot, computed, type Outcome } from '../outcome';
import { leakBand, leakPercent } from './leak-down';

/**
 * Where the air is heard, and what that says.
 * Source: an aviation association's article and a small-engine manual for the first three; the
 * last two trade-wide (reference C14).
 */
export const whereAirComesOut = {
	exhaust: { at: 'the exhaust', says: 'exhaust valve', path: 'valves-and-gasket' },
	inlet: { at: 'the inlet or throttle', says: 'inlet valve', path: 'valves-and-gasket' },
	breather: {
		at: 'the crankcase breather or oil filler',
		says: 'rings, piston or bore',
		path: 'piston-and-rings'
	},
	coolant: {
		at: 'the radiator, as bubbles',
		says: 'head gasket, cracked head or liner',
		path: 'valves-and-gasket'
	},
	neighbour: {
		at: 'the neighbouring plug hole',
		says: 'head gasket between the two cylinders',
		path: 'valves-and-gasket'
	}
} as const;
export type AirWay = keyof typeof whereAirComesOut;

/** Words that people write for them. */
const spellings: readonly [RegExp, AirWay][] = [
	[/^(ex(h|haust)?( valve)?|tail ?pipe)$/i, 'exhaust'],
	[/^(in(let|take)?( valve)?|throttle|carburett?or)$/i, 'inlet'],
	[/^(breather|oil ?filler|crank ?case|filler|dipstick|rings?)$/i, 'breather'],
	[/^(coolant|bubbles|radiator|expansion tank)$/i, 'coolant'],
	[/^(neighbou?r|(next )?plug ?hole|next( cylinder)?|gasket)$/i, 'neighbour']
];

/**
 * A place where air is heard, as a person writes it.
 *
 * @param typed a word such as "exhaust", "breather", "next plug hole"
 * @returns the way; "cannot" lists the words that are known
 * @example airWay('oil filler') // 'breather'
 */
export function airWay(typed: string): Outcome<AirWay> {
	const found = spellings.find(([pattern]) => pattern.test(typed.trim()))?.[1];
	return found
		? computed(found)
		: cannot(`air is heard at ${Object.keys(whereAirComesOut).join(', ')}: write one of these`);
}

/** Limits that one maker prints at about 5 bar, per cent (reference C15; maker not named). */
export const printedLeakLimits = {
	total: 25,
	'valves-and-gasket': 10,
	'piston-and-rings': 20
} as const;

export type LeakVerdict = {
	percent: number;
	/** What the trade calls it. */
	band: string;
	/** By the rule of the differential test: more than a quarter is lost. */
	suspect: boolean;
	/** The limit of `printedLeakLimits` for the way that the air takes, and whether it is passed. */
	printed?: { limit: number; passed: boolean };
	/** What to do; nothing where nothing follows. */
	next?: string;
};

/**
 * What a leak-down test says of one cylinder, and what to do next.
 *
 * @param inputBar regulator gauge @param heldBar cylinder gauge, the same unit, 0 to the input
 * @param way where nearly all of the air is heard, where somebody listened
 * @returns leakage in per cent with its band, suspicion and the next step
 * Source: FAA AC 43.13-1B, para 8-14 (a loss over 25 per cent is looked into, after another run and
 *   a second test); reference entries C10, C11, C14 and C15.
 * @example leakVerdict(5.5, 3.9, 'exhaust') // 29.1 %, needs work, suspect: its exhaust valve
 */
export function leakVerdict(inputBar: number, heldBar: number, way?: AirWay): Outcome<LeakVerdict> {
	const percent = leakPercent(inputBar, heldBar);
	if (!percent.ok) return percent;
	const band = leakBand(percent.value);
	if (!band.ok) return band;
	const { suspect, words } = band.value;
	const limit = way && printedLeakLimits[whereAirComesOut[way].path];
	const printed = limit && { limit, passed: percent.value > limit + 1e-9 };
	const next = nextFor(suspect, percent.value, way);
	return computed({
		percent: percent.value,
		band: words,
		suspect,
		...(printed ? { printed } : {}),
		...(next ? { next } : {})
	});
}

function nextFor(suspect: boolean, percent: number, way?: AirWay): string | undefined {
	if (!suspect)
		return percent > 10
			? 'Note it with the hours, and read it again at the next service.'
			: undefined;
	const again =
		'Make sure that it stands at the top dead centre of its compression stroke. If the engine runs, run it warm and test again: what was a speck under a valve is gone then.';
	return way
		? `${again} Still more than a quarter lost: strip it there, ${whereAirComesOut[way].says}.`
		: `${again} Still more than a quarter lost: listen where the air comes out.`;
}

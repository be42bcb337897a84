const widest = 42;
/** Seconds. A caption that stays longer is read twice. */
const longest = 7;

/** @param {number} seconds */
function stamp(seconds) {
	const ms = Math.round(seconds * 1000);
	const part = (/** @type {number} */ value, width = 2) => String(value).padStart(width, '0');
	return `${part(Math.floor(ms / 3600000))}:${part(Math.floor(ms / 60000) % 60)}:${part(Math.floor(ms / 1000) % 60)}.${part(ms % 1000, 3)}`;
}

/**
 * At most two lines of 42 characters, broken where the two are most alike.
 * @param {string} text
 */
export function inTwoLines(text) {
	if (text.length <= widest) return text;
	const words = text.split(' ');
	const breaks = words
		.slice(1)
		.map((_, i) => [words.slice(0, i + 1).join(' '), words.slice(i + 1).join(' ')]);
	const fits = breaks.filter((pair) => pair.every((one) => one.length <= widest));
	const best = fits.sort((a, b) => spread(a) - spread(b))[0];
	if (!best) throw new Error(`Too long for a caption: ${text}`);
	return best.join('\n');
}

/** @param {string[]} pair */
function spread([a = '', b = '']) {
	return Math.abs(a.length - b.length);
}

/** Each caption stays a little after its sentence, never into the next. @param {import('./speak.js').TimedLine[]} lines */
export function captionsOf(lines) {
	const cues = lines.map((line, i) => {
		const next = lines[i + 1]?.startS ?? line.endS + 2;
		const stays = Math.max(line.endS, Math.min(line.endS + 0.7, line.startS + longest));
		const end = Math.min(stays, next - 0.1);
		return `${stamp(line.startS)} --> ${stamp(end)}\n${inTwoLines(line.say)}`;
	});
	return `WEBVTT\n\n${cues.join('\n\n')}\n`;
}

/** @param {import('./speak.js').Timed} timed */
export function chaptersOf({ lines, durationS }) {
	const heads = lines.filter((line) => line.chapter);
	const cues = heads.map((head, i) => {
		const start = i === 0 ? 0 : head.startS - 0.5;
		const end = i + 1 < heads.length ? (heads[i + 1]?.startS ?? 0) - 0.5 : durationS;
		return `${stamp(start)} --> ${stamp(end)}\n${head.chapter}`;
	});
	return `WEBVTT\n\n${cues.join('\n\n')}\n`;
}

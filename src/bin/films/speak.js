import { execFileSync } from 'node:child_process';
import { readFileSync, writeFileSync } from 'node:fs';
import { join } from 'node:path';

/**
 * @typedef {{ chapter?: string, say: string, draw: (p: number) => string }} Line
 * @typedef {Line & { startS: number, endS: number }} TimedLine
 * @typedef {{ lines: TimedLine[], durationS: number, wav: string }} Timed
 */

const rate = 22050;
const before = 1.2;
const between = 0.9;
const betweenChapters = 1.6;
const after = 2;

/**
 * Speaks every sentence, measures how long it really takes, and lays all of them on one track.
 * @param {Line[]} lines @param {string} work @returns {Promise<Timed>}
 */
export async function speak(lines, work) {
	let at = before;
	/** @type {{ startS: number, samples: Buffer }[]} */
	const spoken = [];
	const timed = lines.map((line, index) => {
		const file = join(work, `${index}.wav`);
		execFileSync('espeak-ng', ['-v', 'en-gb', '-s', '138', '-g', '2', '-w', file, line.say]);
		const samples = samplesOf(readFileSync(file));
		if (line.chapter && index > 0) at += betweenChapters - between;
		const startS = at;
		const endS = startS + samples.length / 2 / rate;
		spoken.push({ startS, samples });
		at = endS + between;
		return { ...line, startS, endS };
	});
	const durationS = Math.ceil((at - between + after) * 10) / 10;
	const track = Buffer.alloc(Math.round(durationS * rate) * 2);
	for (const { startS, samples } of spoken) samples.copy(track, Math.round(startS * rate) * 2);
	const wav = join(work, 'track.raw');
	writeFileSync(wav, track);
	return { lines: timed, durationS, wav };
}

export const audioInput = ['-f', 's16le', '-ar', String(rate), '-ac', '1'];

/** The 16-bit samples of a mono wav, whatever chunks stand before them. @param {Buffer} wav */
function samplesOf(wav) {
	const at = wav.indexOf('data');
	return wav.subarray(at + 8);
}

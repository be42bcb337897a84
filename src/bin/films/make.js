/**
 * Makes the lesson films again: draws each frame, speaks each sentence, and writes film, poster,
 * captions and chapters beside the lesson. Needs Debian's ffmpeg and espeak-ng; the results are
 * in the repository, so nobody else does.
 *
 *   node src/bin/films/make.js [crankpins|fasteners]
 */
import { mkdtempSync, rmSync } from 'node:fs';
import { writeFile } from 'node:fs/promises';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { captionsOf, chaptersOf } from './captions.js';
import { crankpins } from './crankpins.js';
import { encode } from './encode.js';
import { fasteners } from './fasteners.js';
import { letterWithOurFonts } from './fonts.js';
import { speak } from './speak.js';

const films = { crankpins, fasteners };
const wanted = process.argv[2];

for (const [name, film] of Object.entries(films)) {
	if (wanted && wanted !== name) continue;
	const work = mkdtempSync(join(tmpdir(), 'ringland-film-'));
	try {
		letterWithOurFonts(work);
		const timed = await speak(film.lines, work);
		const folder = join('lessons/courses/reading-failed-engines', film.folder);
		await encode({ film, timed, work, folder });
		await writeFile(join(folder, 'captions.en.vtt'), captionsOf(timed.lines));
		await writeFile(join(folder, 'chapters.en.vtt'), chaptersOf(timed));
		console.info(`${name}: ${timed.durationS.toFixed(1)} s`);
	} finally {
		rmSync(work, { recursive: true });
	}
}

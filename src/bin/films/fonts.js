import { writeFileSync } from 'node:fs';
import { createRequire } from 'node:module';
import { dirname, join } from 'node:path';

const require = createRequire(import.meta.url);

/**
 * Gives the drawing library our own lettering, whatever is installed on the machine. Before the
 * library is loaded: it reads this once.
 * @param {string} work
 */
export function letterWithOurFonts(work) {
	const folder = dirname(require.resolve('@expo-google-fonts/barlow-condensed/package.json'));
	const file = join(work, 'fonts.conf');
	writeFileSync(
		file,
		`<?xml version="1.0"?><!DOCTYPE fontconfig SYSTEM "fonts.dtd"><fontconfig><dir>${folder}</dir><cachedir>${work}</cachedir></fontconfig>`
	);
	process.env.FONTCONFIG_FILE = file;
}

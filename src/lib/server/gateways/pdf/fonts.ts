import { createRequire } from 'node:module';
import { Problem } from '$lib/domain/problem';

/** Whole TTF files: the web fonts of the same families lack letters and cannot be embedded. */
const files = {
	label: '@expo-google-fonts/barlow-condensed/500Medium/BarlowCondensed_500Medium.ttf',
	heading: '@expo-google-fonts/barlow-condensed/600SemiBold/BarlowCondensed_600SemiBold.ttf',
	body: '@expo-google-fonts/atkinson-hyperlegible-next/400Regular/AtkinsonHyperlegibleNext_400Regular.ttf',
	strong:
		'@expo-google-fonts/atkinson-hyperlegible-next/700Bold/AtkinsonHyperlegibleNext_700Bold.ttf',
	figure: '@expo-google-fonts/spline-sans-mono/400Regular/SplineSansMono_400Regular.ttf',
	/** For names in letters that the look's own fonts do not have: Greek, Cyrillic and others. */
	other: 'dejavu-fonts-ttf/ttf/DejaVuSansCondensed.ttf',
	otherStrong: 'dejavu-fonts-ttf/ttf/DejaVuSansCondensed-Bold.ttf'
} as const;

export type FontName = keyof typeof files;

const instead: Partial<Record<FontName, readonly FontName[]>> = {
	label: ['other'],
	heading: ['otherStrong'],
	body: ['label', 'other'],
	strong: ['heading', 'otherStrong'],
	figure: ['label', 'other']
};

/** The part of pdfkit's font reader that says what a font can write, and how wide. */
type Reader = {
	_font: {
		font: {
			hasGlyphForCodePoint(codePoint: number): boolean;
			glyphForCodePoint(codePoint: number): { advanceWidth: number };
		};
	};
};

export function registerFonts(doc: PDFKit.PDFDocument): void {
	const { resolve } = createRequire(import.meta.url);
	for (const [name, file] of Object.entries(files)) doc.registerFont(name, resolve(file));
	for (const name of ['label', 'heading'] as const) closeUp(doc, name);
}

/** These two weights set a capital Ø a quarter wider than its drawing; a name shows the gap. */
function closeUp(doc: PDFKit.PDFDocument, name: FontName): void {
	const font = readerOf(doc, name);
	const advanceWidth = font.glyphForCodePoint(0x4f).advanceWidth; // O
	Object.defineProperty(font.glyphForCodePoint(0xd8), 'advanceWidth', { value: advanceWidth });
}

/**
 * The wanted font, or one that has every letter of the text: a certificate with empty boxes in
 * the name is none.
 * @throws Problem naming the letters that none of them has
 */
export function fontFor(doc: PDFKit.PDFDocument, wanted: FontName, text: string): FontName {
	let lacking: string[] = [];
	for (const name of [wanted, ...(instead[wanted] ?? [])]) {
		const font = readerOf(doc, name);
		lacking = [...text].filter(
			(one) => !/\s/.test(one) && !font.hasGlyphForCodePoint(one.codePointAt(0) ?? 0)
		);
		if (lacking.length === 0) return name;
	}
	throw new Problem(
		'refused',
		'The fonts of the certificate do not have these letters: {letters}',
		{
			letters: [...new Set(lacking)].join(' ')
		}
	);
}

function readerOf(doc: PDFKit.PDFDocument, name: FontName) {
	return (doc.font(name) as unknown as Reader)._font.font;
}

export type CopyName = 'small' | 'medium' | 'large';
export type CopyType = 'image/webp' | 'image/jpeg';

/**
 * The clean copies of a photograph. WebP for what lists and pages send over a workshop's poor
 * reception; JPEG for what a marker zooms into, prints or saves, since every program opens it.
 */
export const copies: readonly { name: CopyName; longestPx: number; type: CopyType }[] = [
	{ name: 'small', longestPx: 320, type: 'image/webp' },
	{ name: 'medium', longestPx: 1280, type: 'image/webp' },
	{ name: 'large', longestPx: 2560, type: 'image/jpeg' }
];

/**
 * A phone's largest common sensor mode is 50 megapixels; a bomb names far more. AVIF is unpacked
 * whole, at 23 bytes a pixel (1.1 GB for 48 megapixels, measured; JPEG takes 0.2), so it gets less.
 */
export function largestPixels(mediaType: string): number {
	return mediaType === 'image/avif' ? 25_000_000 : 64_000_000;
}

export type ImageQuestion = {
	source: string;
	/** An existing folder of the caller's; one file a copy is written there. */
	folder: string;
	mediaType: string;
	/** Off for pictures that are no evidence: looking in vain takes seconds. */
	seekTags?: boolean;
};

export type CleanCopy = {
	name: CopyName;
	path: string;
	mediaType: CopyType;
	widthPx: number;
	heightPx: number;
};

export type ImageAnswer = {
	/** As it is seen: after turning by the camera's orientation mark. */
	widthPx: number;
	heightPx: number;
	copies: CleanCopy[];
	/** Codes of the evidence tags that were read in it, none twice. */
	tags: string[];
	/** 16 hexadecimal digits that stay nearly the same when the picture is saved again. */
	likeness: string;
};

import { join } from 'node:path';
import sharp, { type Sharp } from 'sharp';
import { Problem } from '$lib/domain/problem';
import {
	copies,
	largestPixels,
	type CleanCopy,
	type ImageAnswer,
	type ImageQuestion
} from './copies';
import { likenessOf } from './likeness';
import { readTags } from './read-tags';

// Only the readers of the four formats: none of the others is ever offered a stranger's bytes.
sharp.block({ operation: ['VipsForeignLoad'] });
sharp.unblock({
	operation: [
		'VipsForeignLoadJpegFile',
		'VipsForeignLoadPngFile',
		'VipsForeignLoadWebpFile',
		'VipsForeignLoadHeifFile'
	]
});
sharp.cache(false);
sharp.concurrency(1);

const formatOf: Record<string, string> = {
	'image/jpeg': 'jpeg',
	'image/png': 'png',
	'image/webp': 'webp',
	'image/avif': 'heif'
};

/**
 * Reads a photograph once into plain pixels, at most as large as the largest copy, and writes
 * every copy from those: what is not a pixel (place, camera, thumbnails, things hung on behind)
 * cannot come along.
 */
export async function cleanCopies(question: ImageQuestion): Promise<ImageAnswer> {
	const seen = await lookedAt(question);
	const { data, info } = await decoded(question);
	const plain = () => sharp(data, { raw: { width: info.width, height: info.height, channels: 3 } });
	const made: CleanCopy[] = [];
	for (const { name, longestPx, type } of copies) {
		const path = join(question.folder, name);
		const sized = fit(plain(), longestPx);
		const written = await (
			type === 'image/webp' ? sized.webp({ quality: 82 }) : sized.jpeg({ quality: 86 })
		).toFile(path);
		const { width: widthPx, height: heightPx } = written;
		made.push({ name, path, mediaType: type, widthPx, heightPx });
	}
	const tags = question.seekTags === false ? [] : await readTags(plain);
	return { ...seen, copies: made, tags, likeness: await likenessOf(plain()) };
}

async function lookedAt({ source, mediaType }: ImageQuestion) {
	const found = await open(source, mediaType).metadata().catch(refuse(mediaType));
	if (found.format !== formatOf[mediaType])
		throw new Problem('input', 'This file says that it is one kind of picture and is another.');
	const { width, height } = found.autoOrient;
	if (width * height > largestPixels(mediaType)) throw tooLarge(mediaType);
	if (Math.min(width, height) < 16)
		throw new Problem('input', 'This picture is only {width} by {height} pixels.', {
			width,
			height
		});
	return { widthPx: width, heightPx: height };
}

function decoded({ source, mediaType }: ImageQuestion) {
	return fit(open(source, mediaType).autoOrient(), copies.at(-1)?.longestPx ?? 0)
		.flatten({ background: '#ffffff' })
		.toColourspace('srgb')
		.removeAlpha()
		.raw()
		.toBuffer({ resolveWithObject: true })
		.catch(refuse(mediaType));
}

function open(source: string, mediaType: string): Sharp {
	const limitInputPixels = largestPixels(mediaType);
	return sharp(source, { limitInputPixels, failOn: 'error', pages: 1 });
}

function fit(picture: Sharp, longestPx: number): Sharp {
	return picture.resize(longestPx, longestPx, { fit: 'inside', withoutEnlargement: true });
}

function refuse(mediaType: string): (error: unknown) => never {
	return (error) => {
		if (error instanceof Error && /pixel limit/i.test(error.message)) throw tooLarge(mediaType);
		throw new Problem('input', 'This picture is damaged or cut short. Take or send it again.');
	};
}

function tooLarge(mediaType: string): Problem {
	return new Problem('too-large', 'This picture has more than {most} megapixels.', {
		most: largestPixels(mediaType) / 1e6
	});
}

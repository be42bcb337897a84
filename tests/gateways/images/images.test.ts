import { readFile, rm } from 'node:fs/promises';
import sharp, { type Sharp } from 'sharp';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { Problem } from '$lib/domain/problem';
import { makeImages } from '$lib/server/gateways/images/images';
import { likenessDistance } from '$lib/server/gateways/images/likeness';
import { qrSvg } from '$lib/server/gateways/qr/qr';
import { bench, folder, laid, printedTag, saved } from './pictures';

const mine = '9FQ47K2MX0AB3DZW';
const partners = 'HJKMNPQRSTVWXYZ0';
const images = makeImages();
let at = '';

beforeAll(async () => {
	at = await folder();
});
afterAll(async () => {
	await images.close();
	await rm(at, { recursive: true });
});

const ask = async (bytes: Uint8Array, mediaType = 'image/jpeg', seekTags = false) =>
	images.cleanCopies({ source: await saved(at, 'source', bytes), folder: at, mediaType, seekTags });
const tagsIn = async (picture: Sharp) =>
	(await ask(await picture.jpeg({ quality: 80 }).toBuffer(), 'image/jpeg', true)).tags;
const refusal = (bytes: Uint8Array, mediaType?: string) =>
	ask(bytes, mediaType).then(
		() => 'taken',
		(error: unknown) => (error instanceof Problem ? `${error.code}: ${error.words}` : error)
	);

describe('clean copies', () => {
	it('turns by the camera mark, makes three sizes, and drops place and camera', async () => {
		const photograph = await bench(3000, 2000)
			.withExif({
				IFD0: { Make: 'Invented camera' },
				IFD3: { GPSLatitude: '59/1 20/1 0/1', GPSLatitudeRef: 'N' }
			})
			.withMetadata({ orientation: 6 })
			.jpeg()
			.toBuffer();
		const before = await sharp(photograph).metadata();
		expect(before.orientation).toBe(6);
		expect(before.exif).toBeDefined();
		const answer = await ask(photograph);
		expect([answer.widthPx, answer.heightPx]).toEqual([2000, 3000]);
		expect(
			answer.copies.map((one) => [one.name, one.mediaType, one.widthPx, one.heightPx])
		).toEqual([
			['small', 'image/webp', 213, 320],
			['medium', 'image/webp', 854, 1280],
			['large', 'image/jpeg', 1707, 2560]
		]);
		for (const copy of answer.copies) {
			const bytes = await readFile(copy.path);
			const after = await sharp(bytes).metadata();
			expect([after.exif, after.xmp, after.iptc, after.icc, after.orientation]).toEqual(
				Array(5).fill(undefined)
			);
			expect(bytes.includes('Invented camera')).toBe(false);
		}
	});

	it.each(['jpeg', 'png', 'webp', 'avif'] as const)(
		'takes %s and does not enlarge',
		async (kind) => {
			const answer = await ask(await bench(400, 300).toFormat(kind).toBuffer(), `image/${kind}`);
			expect(answer.copies.map((one) => one.widthPx)).toEqual([320, 400, 400]);
		}
	);

	it('gives a picture saved again, smaller, nearly the same likeness', async () => {
		const one = await ask(await bench(1600, 1200).jpeg().toBuffer());
		const whole = await bench(1600, 1200).png().toBuffer();
		const again = await ask(await sharp(whole).resize(900).jpeg({ quality: 50 }).toBuffer());
		const other = await ask(await sharp(whole).flop().jpeg().toBuffer());
		expect(likenessDistance(one.likeness, again.likeness)).toBeLessThanOrEqual(8);
		expect(likenessDistance(one.likeness, other.likeness)).toBeGreaterThan(16);
	});
});

describe('evidence tags in photographs', () => {
	it.each([
		['straight and near', 3000, 2000, 600, 0],
		['far, in a large picture', 4000, 3000, 260, 0],
		['turned by 37 degrees', 3000, 2000, 420, 37],
		['turned by 200 degrees', 3000, 2000, 420, 200]
	])('reads one that lies %s', async (_how, width, height, side, turned) => {
		const tag = await printedTag(mine, side, turned);
		const picture = await laid(bench(width, height), [{ input: tag, left: 700, top: 900 }]);
		expect(await tagsIn(picture)).toEqual([mine]);
	});

	it('reads one in shade and out of focus', async () => {
		const tag = await printedTag(mine, 500, 12);
		const picture = await laid(bench(3000, 2000), [{ input: tag, left: 300, top: 900 }]);
		const dim = sharp(await picture.png().toBuffer())
			.blur(3)
			.linear(0.3, 10);
		expect(await tagsIn(dim)).toEqual([mine]);
	});

	it('reads both tags of two who share the engine', async () => {
		const picture = await laid(bench(3000, 2000), [
			{ input: await printedTag(mine, 450), left: 200, top: 1200 },
			{ input: await printedTag(partners, 450), left: 1900, top: 1200 }
		]);
		const tags = await tagsIn(picture);
		expect([...tags].sort()).toEqual([mine, partners].sort());
	});

	it('says that there is none, and leaves codes that are not ours alone', async () => {
		expect(await tagsIn(bench(1600, 1200))).toEqual([]);
		const poster = await sharp(Buffer.from(qrSvg('https://poster.example', 'a poster')))
			.resize(500)
			.png()
			.toBuffer();
		expect(
			await tagsIn(await laid(bench(1600, 1200), [{ input: poster, left: 99, top: 99 }]))
		).toEqual([]);
		const both = [
			{ input: poster, left: 99, top: 99 },
			{ input: await printedTag(mine, 400), left: 900, top: 500 }
		];
		expect(await tagsIn(await laid(bench(1600, 1200), both))).toEqual([mine]);
	}, 30_000);
});

describe('hostile files', () => {
	it('refuses one that was cut short', async () => {
		const whole = await bench(1200, 900).jpeg().toBuffer();
		expect(await refusal(whole.subarray(0, whole.length / 2))).toMatch(/^input: .*damaged/);
		const png = await bench(300, 200).png().toBuffer();
		expect(await refusal(png.subarray(0, png.length - 900), 'image/png')).toMatch(
			/^input: .*damaged/
		);
	});

	it('refuses a pixel bomb from its header, without unpacking it', async () => {
		const flat = { width: 20_000, height: 20_000, channels: 3 as const, background: '#000' };
		const bomb = await sharp({ create: flat, limitInputPixels: false })
			.png({ compressionLevel: 9 })
			.toBuffer();
		const began = performance.now();
		expect(await refusal(bomb, 'image/png')).toMatch(/^too-large/);
		expect(performance.now() - began).toBeLessThan(2000);
	}, 60_000);

	it('refuses another format under a false name, drawings that run programs, and plain noise', async () => {
		const png = await bench(300, 200).png().toBuffer();
		expect(await refusal(png, 'image/jpeg')).toMatch(/^input: .*one kind of picture/);
		const gif = await bench(300, 200).gif().toBuffer();
		expect(await refusal(gif, 'image/jpeg')).toMatch(/^input: .*damaged/);
		const svg = Buffer.from('<svg xmlns="http://www.w3.org/2000/svg" width="99" height="99"/>');
		expect(await refusal(svg, 'image/png')).toMatch(/second thing.*/);
		expect(await refusal(Buffer.alloc(5000, 'x'), 'image/webp')).toMatch(/^input: .*damaged/);
	});

	it('refuses a picture that is also an archive, a document or a page', async () => {
		const jpeg = await bench(300, 200).jpeg().toBuffer();
		const end = Buffer.alloc(22);
		end.write('PK\x05\x06', 'latin1');
		expect(await refusal(Buffer.concat([jpeg, end]))).toMatch(/second thing/);
		const commented = (text: string) => {
			const comment = Buffer.from(text, 'latin1');
			const mark = Buffer.from([0xff, 0xd8, 0xff, 0xfe, 0, comment.length + 2]);
			return Buffer.concat([mark, comment, jpeg.subarray(2)]);
		};
		expect(await refusal(commented('%PDF-1.7 '))).toMatch(/second thing/);
		expect(await refusal(commented('<script>alert(1)</script>'))).toMatch(/second thing/);
		expect(await refusal(commented('a plain comment'))).toBe('taken');
	});

	it('gives up on one that takes too long, and takes the next', async () => {
		const hasty = makeImages({ answerWithinMs: 1 });
		const source = await saved(at, 'slow', await bench(2000, 1500).png().toBuffer());
		const asked = hasty.cleanCopies({ source, folder: at, mediaType: 'image/png' });
		await expect(asked).rejects.toThrow('takes too long');
		await hasty.close();
		expect(await refusal(await bench(200, 200).jpeg().toBuffer())).toBe('taken');
	});
});

import { toBuffer } from 'qrcode';
import { seeded } from '../../../src/lib/kernel/random/random';
import sharp from 'sharp';

/**
 * A photograph as a phone at the bench takes it: grey metal with some noise, the evidence tag
 * laid in where there is one, a place in its tags that must not survive.
 * @param look the same look gives the same picture
 */
export async function photograph(look: string, tag?: string): Promise<Buffer> {
	const random = seeded(look);
	const [width, height] = [1600, 1200];
	const discs = Array.from({ length: 12 }, () => {
		const grey = random.integer(40, 200);
		return `<circle cx="${random.integer(0, width)}" cy="${random.integer(0, height)}" r="${random.integer(40, 260)}" fill="rgb(${grey},${grey},${grey + 8})"/>`;
	});
	const ground = Buffer.from(
		`<svg xmlns="http://www.w3.org/2000/svg" width="${width}" height="${height}"><rect width="100%" height="100%" fill="#777"/>${discs.join('')}</svg>`
	);
	const laid = tag
		? [{ input: await toBuffer(tag, { width: 420, margin: 4 }), left: 1100, top: 700 }]
		: [];
	return sharp(ground)
		.composite(laid)
		.withExif({
			IFD0: { Make: 'A phone' },
			IFD3: { GPSLatitudeRef: 'N', GPSLatitude: '59/1 54/1 0/1' }
		})
		.jpeg({ quality: 88 })
		.toBuffer();
}

import sharp from 'sharp';

/** A drawing as a photograph's file: for the demo, whose photographs are drawn. */
export function drawAsJpeg(svg: string, widthPx: number): Promise<Buffer> {
	return sharp(Buffer.from(svg)).resize({ width: widthPx }).jpeg({ quality: 84 }).toBuffer();
}

import { spawn } from 'node:child_process';
import { once } from 'node:events';
import { join } from 'node:path';
import { audioInput } from './speak.js';

const [width, height, fps] = [960, 540, 12];

/**
 * Draws every frame once and hands it to two encoders at a time: WebM (VP9, Opus) and MP4 (H.264,
 * AAC). A frame that is the same as the one before is not drawn again.
 * @param {{ film: { folder: string, posterAtS: number }, timed: import('./speak.js').Timed, work: string, folder: string }} of
 */
export async function encode({ film, timed, folder }) {
	const { default: sharp } = await import('sharp');
	const targets = [
		[
			'-c:v',
			'libvpx-vp9',
			'-b:v',
			'0',
			'-crf',
			'40',
			'-deadline',
			'good',
			'-cpu-used',
			'5',
			'-row-mt',
			'1',
			'-c:a',
			'libopus',
			'-b:a',
			'40k',
			join(folder, 'film.webm')
		],
		[
			'-c:v',
			'libx264',
			'-crf',
			'27',
			'-preset',
			'medium',
			'-tune',
			'animation',
			'-pix_fmt',
			'yuv420p',
			'-movflags',
			'+faststart',
			'-c:a',
			'aac',
			'-b:a',
			'64k',
			join(folder, 'film.mp4')
		]
	];
	const encoders = targets.map((target) => {
		const input = [
			'-f',
			'rawvideo',
			'-pix_fmt',
			'rgb24',
			'-s',
			`${width}x${height}`,
			'-r',
			String(fps),
			'-i',
			'pipe:0'
		];
		const length = ['-t', String(timed.durationS)];
		const child = spawn(
			'ffmpeg',
			['-y', '-v', 'error', ...input, ...audioInput, '-i', timed.wav, ...length, ...target],
			{ stdio: ['pipe', 'inherit', 'inherit'] }
		);
		return { child, done: once(child, 'exit') };
	});
	let lastSvg = '';
	/** @type {Buffer} */
	let pixels = Buffer.alloc(0);
	for (let frame = 0; frame < Math.ceil(timed.durationS * fps); frame++) {
		const svg = sheet(drawingAt(timed, frame / fps));
		if (svg !== lastSvg) {
			pixels = await sharp(Buffer.from(svg)).removeAlpha().raw().toBuffer();
			lastSvg = svg;
		}
		for (const { child } of encoders)
			if (!child.stdin.write(pixels)) await once(child.stdin, 'drain');
	}
	for (const { child, done } of encoders) {
		child.stdin.end();
		const [code] = await done;
		if (code !== 0) throw new Error(`ffmpeg ended with ${code}`);
	}
	const poster = sheet(drawingAt(timed, film.posterAtS));
	await sharp(Buffer.from(poster)).webp({ quality: 80 }).toFile(join(folder, 'poster.webp'));
}

/** A line's drawing moves while it is said and then rests. @param {import('./speak.js').Timed} timed @param {number} at */
function drawingAt({ lines }, at) {
	const line = [...lines].reverse().find((one) => at >= one.startS - 0.3) ?? lines[0];
	if (!line) throw new Error('a film has lines');
	const p = Math.min(
		1,
		Math.max(0, (at - line.startS) / Math.max(0.5, (line.endS - line.startS) * 0.85))
	);
	return line.draw(Math.round(ease(p) * 60) / 60);
}

/** @param {number} p */
function ease(p) {
	return p * p * (3 - 2 * p);
}

/** @param {string} body */
function sheet(body) {
	return `<svg xmlns="http://www.w3.org/2000/svg" viewBox="0 0 ${width} ${height}" width="${width}" height="${height}">
<defs><pattern id="hatch" width="9" height="9" patternUnits="userSpaceOnUse" patternTransform="rotate(45)"><path d="M0 0v9" stroke="#9cc7f4" stroke-opacity=".55"/></pattern></defs>
<rect width="${width}" height="${height}" fill="#10273f"/>
<g fill="none" stroke="#9cc7f4" stroke-width="2.2" font-family="Barlow Condensed" font-weight="500">${body}</g></svg>`;
}

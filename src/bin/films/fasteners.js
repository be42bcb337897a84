import { between, brass, callOut, centreLine, dimension, heading, text } from './pen.js';

/** A bolt through a joint, stretched by `pull` pixels. @param {number} pull @param {string} [more] */
const joint = (pull, more = '') => `${heading('A bolt is a spring')}
<path d="M260 230h440v70H260zM260 300h440v70H260z" fill="url(#hatch)"/>
<path d="M430 ${230 - 46}h100v46h-100z" fill="#1b3a59"/><path d="M455 230h50v${150 + pull}h-50z" fill="#1b3a59"/>
<path d="M430 370h100v48h-100z" fill="#1b3a59"/><path d="M455 ${390 + pull / 2}h50M455 ${402 + pull / 2}h50" stroke-width="1.4"/>
${centreLine(480, 150, 480, 470)}${more}`;

const shares = [
	{ words: 'under the head, about a half', share: 0.5, fill: '#34506c' },
	{ words: 'in the thread, most of the rest', share: 0.4, fill: '#1b3a59' },
	{ words: 'stretch, a tenth or so', share: 0.1, fill: brass }
];
/** Where the torque goes. @param {number} shown how many shares are named */
function bar(shown) {
	let x = 120;
	const parts = shares.map(({ share, fill, words }, i) => {
		const wide = share * 720;
		const part = `<rect x="${x}" y="240" width="${wide}" height="90" fill="${fill}"/>${i < shown ? callOut(x + wide / 2, 300, x + wide / 2 - (i === 2 ? 60 : 0), 400 + i * 46, words, i === 2 ? 'end' : 'start') : ''}`;
		x += wide;
		return part;
	});
	return heading('Where the torque goes') + parts.join('');
}

/** A bolt head from above with an angle gauge. @param {number} degrees @param {string} [more] */
function angle(degrees, more = '') {
	const rad = ((degrees - 90) * Math.PI) / 180;
	const [x, y] = [480 + 150 * Math.cos(rad), 300 + 150 * Math.sin(rad)];
	const large = degrees > 180 ? 1 : 0;
	return `${heading('Torque, then angle')}<circle cx="480" cy="300" r="150"/>
<path d="M480 232l59 34v68l-59 34-59-34v-68z" fill="#1b3a59" transform="rotate(${degrees} 480 300)"/>
<path d="M480 300V150" stroke-width="1.4"/><path d="M480 300L${x.toFixed(1)} ${y.toFixed(1)}" stroke="${brass}" stroke-width="4"/>
${degrees > 1 ? `<path d="M480 190A110 110 0 ${large} 1 ${(480 + 110 * Math.cos(rad)).toFixed(1)} ${(300 + 110 * Math.sin(rad)).toFixed(1)}" stroke="${brass}" stroke-width="3"/>` : ''}
${text(700, 310, `${Math.round(degrees)}°`, { size: 60, fill: brass })}${more}`;
}

/** Load against turn: straight, then bending over at yield. @param {number} p */
function yielding(p) {
	const to = between(170, 790, p);
	const y = (/** @type {number} */ x) =>
		x < 520 ? 440 - (x - 170) * 0.72 : 188 - 34 * (1 - Math.exp(-(x - 520) / 120));
	const points = Array.from({ length: 60 }, (_, i) => 170 + ((to - 170) * i) / 59).map(
		(x) => `${x.toFixed(1)},${y(x).toFixed(1)}`
	);
	return `${heading('Load against turn')}<path d="M170 120V440H820"/>${text(820, 474, 'turn', { anchor: 'end' })}${text(120, 140, 'load', { anchor: 'middle' })}
<polyline points="${points.join(' ')}" stroke="${brass}" stroke-width="5"/>${to > 540 ? callOut(520, 188, 420, 140, 'yield', 'end') : ''}`;
}

/** Wrench, extension and bolt on one line. @param {string} more */
const wrench = (more) => `${heading('An extension in line')}${centreLine(90, 280, 880, 280)}
<path d="M300 262h480a18 18 0 0 1 0 36H300" fill="#1b3a59"/><path d="M690 262v36M712 262v36M734 262v36" stroke-width="1.4"/>
<circle cx="300" cy="280" r="32" fill="#10273f"/><path d="M287 267h26v26h-26z"/>
<path d="M270 268H190M270 292H190"/><path d="M170 252l26 14v28l-26 14-26-14v-28z" fill="#1b3a59"/>${more}`;

const bolts = [-1, 1].flatMap((side) =>
	[0, 1, 2, 3].map((i) => ({
		id: `${side < 0 ? 'A' : 'B'}${i + 1}`,
		x: 255 + i * 150,
		y: 300 + side * 80
	}))
);
const order = ['A2', 'B3', 'B2', 'A3', 'A1', 'B4', 'B1', 'A4'];
/** @param {number} taken @param {string} words @param {string[]} [way] */
function head(taken, words, way = order) {
	const marks = bolts.map(({ id, x, y }) => {
		const place = way.indexOf(id);
		const done = place < taken;
		return `<circle cx="${x}" cy="${y}" r="28" fill="${done ? brass : '#1b3a59'}"/>${text(x, y + 9, done ? String(place + 1) : id, { anchor: 'middle', fill: done ? '#10273f' : '#e9f0f6' })}`;
	});
	return `${heading(words)}<rect x="180" y="160" width="600" height="280" rx="14"/>${centreLine(140, 300, 820, 300)}${centreLine(480, 130, 480, 470)}${marks.join('')}`;
}

export const fasteners = {
	folder: '02-fasteners-and-torque',
	posterAtS: 48,
	/** @type {import('./speak.js').Line[]} */
	lines: [
		{
			chapter: 'A bolt is a spring',
			say: 'A bolt clamps by being stretched, like a stiff spring.',
			draw: (p) =>
				joint(
					between(0, 26, p),
					`<path d="M600 ${between(230, 200, p)}v${between(140, 196, p)}" stroke="${brass}" stroke-width="4"/>`
				)
		},
		{ say: 'Torque is only our way of stretching it, and a poor one.', draw: () => bar(0) },
		{ say: 'About half of it is lost in friction under the head.', draw: () => bar(1) },
		{ say: 'Most of the rest is lost in the thread.', draw: () => bar(2) },
		{ say: 'A tenth or so is left to stretch the bolt.', draw: () => bar(3) },
		{
			say: 'So read the lubrication on the data sheet before the figure.',
			draw: () =>
				`${heading('Read this line first')}${text(480, 250, 'Main bearing cap bolt', { size: 48, anchor: 'middle' })}${text(480, 330, 'thread oiled', { size: 60, anchor: 'middle', fill: brass })}${text(480, 400, '25 N·m, then 50 N·m', { size: 40, anchor: 'middle' })}`
		},
		{
			chapter: 'Torque, then angle',
			say: 'Friction spoils a torque. It cannot spoil an angle.',
			draw: () => angle(0)
		},
		{
			say: 'Snug the bolt with a small torque first.',
			draw: (p) =>
				angle(
					0,
					text(480, 510, `${Math.round(between(0, 30, p))} N·m`, {
						size: 40,
						anchor: 'middle',
						fill: brass
					})
				)
		},
		{
			say: 'Then turn it through the printed angle, stage by stage.',
			draw: (p) => angle(between(0, 90, p))
		},
		{
			say: 'Here that is ninety degrees, and ninety more.',
			draw: (p) => angle(between(90, 180, p))
		},
		{
			say: 'Beyond yield, more turn hardly adds load, so all bolts clamp alike.',
			draw: (p) => yielding(p)
		},
		{ say: 'Such a bolt is longer afterwards. It is used once.', draw: () => yielding(1) },
		{
			chapter: 'An extension',
			say: 'An extension in line lengthens the lever from hand to bolt.',
			draw: () => wrench(dimension(170, 712, 400, 'L + E'))
		},
		{
			say: 'The wrench still measures at its own square.',
			draw: () => wrench(`${dimension(300, 712, 400, 'L')}${dimension(170, 300, 400, 'E')}`)
		},
		{
			say: 'The setting is the wanted torque, times L, over L plus E.',
			draw: () =>
				wrench(
					`${dimension(300, 712, 400, 'L')}${dimension(170, 300, 400, 'E')}${text(480, 490, 'setting = torque × L / (L + E)', { size: 36, anchor: 'middle' })}`
				)
		},
		{
			say: 'With L four hundred and E fifty, set forty-four for fifty.',
			draw: () =>
				wrench(
					`${dimension(300, 712, 400, '400')}${dimension(170, 300, 400, '50')}${text(480, 490, '50 × 400 / 450 = 44.4 N·m', { size: 36, anchor: 'middle', fill: brass })}`
				)
		},
		{
			say: 'Forget it, and the bolt gets fifty-six.',
			draw: () =>
				wrench(
					`${dimension(300, 712, 400, '400')}${dimension(170, 300, 400, '50')}${text(480, 490, '50 × 450 / 400 = 56.3 N·m', { size: 36, anchor: 'middle', fill: brass })}`
				)
		},
		{
			chapter: 'The order',
			say: 'A head is tightened from the middle outwards.',
			draw: (p) => head(Math.floor(p * 4), 'The printed order')
		},
		{
			say: 'Cross from side to side, and finish one stage before the next.',
			draw: (p) => head(4 + Math.floor(p * 4), 'The printed order')
		},
		{
			say: 'Loosen in the reverse, in rounds, or the head warps.',
			draw: (p) => head(Math.floor(p * 8), 'The reverse, to loosen', [...order].reverse())
		},
		{ say: 'Where the maker prints an order, it wins.', draw: () => head(8, 'The printed order') },
		{
			say: 'And the maker’s service information wins over this film.',
			draw: () => head(8, 'The printed order')
		}
	]
};

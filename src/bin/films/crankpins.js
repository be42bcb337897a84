import { between, brass, callOut, centreLine, dimension, ground, heading, text } from './pen.js';

/** The pin from the side, between its webs. @param {string} [more] */
const pinSide = (more = '') => `${heading('The crankpin')}
${centreLine(150, 300, 810, 300)}
<path d="M230 150h70v300h-70zM660 150h70v300h-70z" fill="url(#hatch)"/>
<path d="M300 220q0 12 14 12h332q14 0 14-12M300 380q0-12 14-12h332q14 0 14 12" />
<circle cx="480" cy="300" r="13" stroke-dasharray="4 4"/>${more}`;

/** The pin seen along its axis; `oval` is drawn many times too large. @param {number} oval @param {string} [more] */
const pinEnd = (oval, more = '') => `${heading('Worn oval, drawn far too large')}
${centreLine(300, 290, 660, 290)}${centreLine(480, 110, 480, 470)}
<circle cx="480" cy="290" r="140" stroke-dasharray="7 7"/>
<ellipse cx="480" cy="${290 + oval / 2}" rx="140" ry="${140 - oval / 2}" fill="url(#hatch)"/>${more}`;

/** A micrometer across the pin: anvils square on it. @param {number} x @param {boolean} upright @param {string} words */
function micrometer(x, upright, words) {
	const body = upright
		? `<path d="M${x - 9} 206h18v26h-18zM${x - 9} 368h18v26h-18z" fill="${brass}" stroke="none"/><path d="M${x - 16} 206v-40h-56v268h56v-40" stroke="${brass}" stroke-width="5"/>`
		: `<ellipse cx="${x}" cy="300" rx="20" ry="68" stroke="${brass}" stroke-width="5"/><circle cx="${x}" cy="300" r="8" fill="${brass}" stroke="none"/>`;
	return body + text(x, 492, words, { anchor: 'middle', fill: brass });
}

/** Rod, cap and shells in section, the split level. @param {number} torque 0 to 1 @param {string} [more] */
const bore = (torque, more = '') => `${heading('The bearing bore')}
${centreLine(260, 290, 700, 290)}${centreLine(480, 110, 480, 480)}
<path d="M300 290v-90q0-80 80-90h200q80 10 80 90v90M300 ${290 + between(14, 0, torque)}v90q0 60 60 60h240q60 0 60-60v-90" />
<path d="M352 290a128 128 0 0 1 256 0M352 ${290 + between(14, 0, torque)}a128 128 0 0 0 256 0"/>
<path d="M372 ${290 - between(7, 0, torque)}a108 108 0 0 1 216 0M372 ${290 + between(20, 0, torque)}a108 108 0 0 0 216 0" stroke-width="7"/>
<path d="M318 120v${between(300, 286, torque)}M642 120v${between(300, 286, torque)}" stroke-dasharray="10 5"/>${more}`;

/** Pin in its bearing with the load on it. @param {string} [more] */
const film = (more = '') => `${heading('The clearance, drawn a hundred times too wide')}
${centreLine(270, 300, 690, 300)}${centreLine(480, 110, 480, 490)}
<circle cx="480" cy="300" r="150"/><circle cx="489" cy="316" r="129" fill="url(#hatch)"/>
<path d="M489 214v86m0 0l-9-18m9 18l9-18" stroke-width="4"/>${text(500, 246, 'load')}
<path d="M400 262a98 98 0 0 0 4 112m0 0l-15-8m15 8l3-17"/>${more}`;

/** A reading with its width against a limit. @param {number} at @param {number} half @param {string} words */
const scale = (at, half, words) => `${heading('What the tool can tell')}
<path d="M120 340H840" /><path d="M660 290v100" stroke-width="5"/>${text(660, 420, 'limit', { anchor: 'middle' })}
<rect x="240" y="318" width="220" height="22" fill="#1b3a59"/>${text(350, 380, 'to build', { anchor: 'middle' })}
<path d="M${at - half} 240H${at + half}" stroke="${brass}" stroke-width="8"/><circle cx="${at}" cy="240" r="13" fill="${brass}" stroke="none"/>
${text(480, 190, words, { anchor: 'middle', size: 34, fill: brass })}`;

export const crankpins = {
	folder: '03-crankpins-and-clearances',
	posterAtS: 60,
	/** @type {import('./speak.js').Line[]} */
	lines: [
		{ chapter: 'The pin', say: 'A crankpin never wears evenly.', draw: () => pinSide() },
		{
			say: 'The rod pushes hardest on one side, so the pin becomes oval.',
			draw: (p) =>
				pinEnd(
					between(0, 34, p),
					`<path d="M480 ${between(60, 118, p)}v30m0 0l-9-16m9 16l9-16" stroke="${brass}" stroke-width="4"/>`
				)
		},
		{
			say: 'Grit from the oil hole, or a bent rod, makes it tapered.',
			draw: (p) =>
				pinSide(
					`<path d="M314 232L646 ${between(232, 252, p)}M314 368L646 ${between(368, 348, p)}" stroke="${brass}" stroke-width="3"/>${callOut(480, 300, 590, 470, 'oil hole')}`
				)
		},
		{
			say: 'Wipe the anvils, close them, and look at the zero.',
			draw: (p) =>
				`${heading('Zero first')}<path d="M380 150h-90v260h90" stroke-width="9"/><path d="M380 262h${between(40, 96, p)}v36h-${between(40, 96, p)}z" fill="${brass}" stroke="none"/><path d="M476 262h70v36h-70z"/><path d="M546 250h150v60H546z"/>${text(620, 290, '0.000', { anchor: 'middle' })}`
		},
		{
			say: 'Measure the pin in two planes, at both ends.',
			draw: (p) =>
				pinSide(micrometer(p < 0.5 ? 360 : 600, true, p < 0.5 ? 'front end' : 'rear end'))
		},
		{
			say: 'In line with the throw, and square to it.',
			draw: (p) => pinSide(micrometer(360, p < 0.5, p < 0.5 ? 'in line' : 'square to it'))
		},
		{
			say: 'Write each reading down before you take the next.',
			draw: (p) =>
				`${heading('Write it down')}${[
					'front, in line   39.991',
					'front, square    39.984',
					'rear, in line    39.990',
					'rear, square     39.980'
				]
					.slice(0, Math.ceil(p * 4) || 1)
					.map((words, i) => text(300, 190 + i * 62, words, { size: 40 }))
					.join('')}`
		},
		{
			say: 'A reading you remember is a reading you have lost.',
			draw: () =>
				`${heading('Write it down')}${text(480, 300, '39.9 ?', { size: 90, anchor: 'middle', fill: brass })}`
		},
		{
			say: 'Two planes at one end give the out of round.',
			draw: () =>
				`${heading('Out of round')}${text(480, 240, '39.990 − 39.980', { size: 58, anchor: 'middle' })}${text(480, 340, '= 0.010 mm', { size: 58, anchor: 'middle', fill: brass })}`
		},
		{
			say: 'Two ends in one plane give the taper.',
			draw: () =>
				`${heading('Taper')}${text(480, 240, '39.984 − 39.980', { size: 58, anchor: 'middle' })}${text(480, 340, '= 0.004 mm', { size: 58, anchor: 'middle', fill: brass })}`
		},
		{
			chapter: 'The bearing bore',
			say: 'Fit the shells dry, and tighten the cap through every stage.',
			draw: (p) => bore(p)
		},
		{
			say: 'Shells stand proud. Only the full load gives the bore its size.',
			draw: (p) => bore(p, callOut(368, 290, 200, 240, 'the split', 'end'))
		},
		{
			say: 'Measure square to the split, front and rear.',
			draw: () =>
				bore(
					1,
					`<path d="M480 182v216" stroke="${brass}" stroke-width="4"/><path d="M480 182l-7 16h14zM480 398l-7-16h14z" fill="${brass}" stroke="none"/>${callOut(480, 240, 720, 200, 'here')}`
				)
		},
		{
			say: 'Near the split the shells are relieved. A reading there means nothing.',
			draw: () => bore(1, callOut(372, 290, 200, 240, 'not here', 'end'))
		},
		{ chapter: 'The clearance', say: 'Bore less pin is the clearance.', draw: () => film() },
		{
			say: 'The film is thinnest just past the load.',
			draw: () => film(callOut(554, 430, 690, 470, 'thinnest film'))
		},
		{
			say: 'It is widest where the load is not.',
			draw: () =>
				film(
					`${callOut(554, 430, 690, 470, 'thinnest film')}${callOut(407, 172, 250, 150, 'widest film', 'end')}`
				)
		},
		{
			say: 'Smallest bore less largest pin is the least clearance.',
			draw: () =>
				`${heading('Least')}${text(480, 240, '40.036 − 39.991', { size: 58, anchor: 'middle' })}${text(480, 340, '= 0.045 mm', { size: 58, anchor: 'middle', fill: brass })}`
		},
		{
			say: 'Largest bore less smallest pin is the most.',
			draw: () =>
				`${heading('Most')}${text(480, 240, '40.038 − 39.980', { size: 58, anchor: 'middle' })}${text(480, 340, '= 0.058 mm', { size: 58, anchor: 'middle', fill: brass })}`
		},
		{
			chapter: 'What the tool can tell',
			say: 'Both readings have a width, and the clearance carries both.',
			draw: (p) => scale(between(400, 540, p), 46, '0.058 ± 0.004 mm: within')
		},
		{
			say: 'If the limit lies inside that width, it is too close to call.',
			draw: (p) => scale(between(540, 644, p), 46, '0.068 ± 0.004 mm: too close to call')
		},
		{
			say: 'That is an honest answer. Fetch a finer instrument, or a second person.',
			draw: (p) =>
				scale(
					644,
					between(46, 12, p),
					p > 0.8 ? '0.068 ± 0.001 mm: within' : '0.068 ± 0.004 mm: too close to call'
				)
		},
		{
			say: 'The maker’s service information wins over every figure shown here.',
			draw: () =>
				`${heading('Before you trust a figure')}${dimension(240, 720, 300, 'the maker’s own data')}<rect x="0" y="536" width="4" height="4" fill="${ground}" stroke="none"/>`
		}
	]
};

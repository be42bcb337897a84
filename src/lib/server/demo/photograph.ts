import { seeded, type Random } from '$lib/kernel/random/random';
import { qrMatrix, qrPath } from '../gateways/qr/qr';

const [width, height] = [1600, 1200];

/**
 * A bench photograph for the demo, drawn: a part on the mat under a lamp, its evidence tag beside
 * it. Every seed gives another light, place and wear, so that no two are the same picture.
 */
export function photographOf(
	shot: string,
	tag: { qrText: string; words: string },
	seed: string
): string {
	const random = seeded(`photograph/${shot}/${seed}`);
	const lamp = { x: random.between(25, 70), y: random.between(15, 45) };
	const turn = random.between(-4, 4);
	return `<svg xmlns="http://www.w3.org/2000/svg" viewBox="0 0 ${width} ${height}" width="${width}" height="${height}">
	<defs>
		<radialGradient id="lamp" cx="${lamp.x}%" cy="${lamp.y}%" r="90%"><stop stop-color="#5c6368"/><stop offset="1" stop-color="#23282c"/></radialGradient>
		<linearGradient id="metal" x1="0" x2="1"><stop stop-color="#565c62"/><stop offset=".35" stop-color="#b9bfc4"/><stop offset=".5" stop-color="#f2f4f5"/><stop offset=".7" stop-color="#9aa1a7"/><stop offset="1" stop-color="#4b5157"/></linearGradient>
		<linearGradient id="dark" x1="0" x2="0" y1="0" y2="1"><stop stop-color="#7b8187"/><stop offset="1" stop-color="#33383c"/></linearGradient>
		<filter id="grain"><feTurbulence type="fractalNoise" baseFrequency=".8" numOctaves="2" seed="${random.integer(1, 999)}"/><feColorMatrix values="0 0 0 0 .5 0 0 0 0 .5 0 0 0 0 .5 0 0 0 .16 0"/></filter>
	</defs>
	<rect width="${width}" height="${height}" fill="url(#lamp)"/>
	${mat(random)}
	<g transform="translate(${800 + random.between(-60, 60)} ${480 + random.between(-30, 30)}) rotate(${turn})">${partOf(shot, random)}</g>
	<rect width="${width}" height="${height}" filter="url(#grain)"/>
	<g transform="translate(${110 + random.between(0, 60)} ${820 + random.between(-20, 20)}) rotate(${random.between(-5, 5)})">${tagCard(tag)}</g>
</svg>`;
}

function mat(random: Random): string {
	const step = 100;
	const shift = random.integer(0, 60);
	const lines: string[] = [];
	for (let x = shift; x < width; x += step) lines.push(`M${x} 0V${height}`);
	for (let y = shift; y < height; y += step) lines.push(`M0 ${y}H${width}`);
	return `<path d="${lines.join('')}" stroke="#8fa08c" stroke-opacity=".22" stroke-width="2" fill="none"/>`;
}

/** Card with quiet zone; 330 units wide in 1600, about what a phone sees of a 7 cm tag. */
function tagCard({ qrText, words }: { qrText: string; words: string }): string {
	const matrix = qrMatrix(qrText);
	const side = 270;
	const scale = side / matrix.size;
	return `<rect width="340" height="350" fill="#f6f1e2"/><rect x="8" y="8" width="324" height="334" fill="none" stroke="#16202b" stroke-width="2"/>
	<g transform="translate(35 28) scale(${scale})"><path d="${qrPath(matrix)}" fill="#101418"/></g>
	<text x="170" y="330" font-family="monospace" font-size="21" text-anchor="middle" fill="#16202b">${words}</text>`;
}

function partOf(shot: string, random: Random): string {
	if (shot === 'shells') return shells(random);
	if (shot === 'pin') return pin(random);
	if (shot === 'pickup-screen' || shot === 'cause') return screen(random);
	if (shot === 'bolts') return bolts(random);
	if (shot === 'laid-out') return laidOut(random);
	return stand(random);
}

function shells(random: Random): string {
	const wipe = random.between(120, 200);
	const one = (y: number, wiped: boolean) => `<g transform="translate(0 ${y})">
		<path d="M-330 -90q330 -90 660 0v190q-330 90 -660 0z" fill="url(#metal)"/>
		${wiped ? `<path d="M${-wipe} -128q${wipe} -24 ${wipe * 2} 0v248q-${wipe} 24 -${wipe * 2} 0z" fill="#7d5a35" opacity=".8"/>` : ''}
		${Array.from({ length: 7 }, () => `<path d="M-280 ${random.between(-70, 80)}q280 -60 560 ${random.between(-8, 8)}" stroke="#454b50" stroke-width="${random.between(1, 3)}" fill="none" opacity=".5"/>`).join('')}
	</g>`;
	return one(-140, true) + one(190, false);
}

function pin(random: Random): string {
	const blue = random.between(60, 150);
	return `<path d="M-560 -230h150v460h-150zM410 -230h150v460H410z" fill="url(#dark)"/>
	<rect x="-410" y="-130" width="820" height="260" fill="url(#metal)" transform="rotate(90 0 0) scale(.32 3.1)"/>
	<rect x="-410" y="-130" width="820" height="260" fill="#8e959b"/>
	<path d="M-410 -130h820v70h-820z" fill="#e8ebed" opacity=".7"/><path d="M-410 60h820v70h-820z" fill="#3f454a" opacity=".6"/>
	<path d="M${-blue} -130h${blue * 2}v260h-${blue * 2}z" fill="#35507c" opacity=".45"/>
	<ellipse cx="${random.between(-60, 60)}" cy="10" rx="26" ry="22" fill="#14181b"/>
	${Array.from({ length: 9 }, () => `<path d="M-400 ${random.between(-110, 110)}h800" stroke="#4a5056" stroke-width="1.5" opacity=".5"/>`).join('')}`;
}

function screen(random: Random): string {
	const strands = Array.from({ length: 14 }, () => {
		const [x, y] = [random.between(-220, 160), random.between(-70, 90)];
		return `<path d="M${x} ${y}q${random.between(20, 70)} ${random.between(-50, 50)} ${random.between(80, 150)} ${random.between(-20, 20)}" stroke="#6f7478" stroke-width="${random.between(9, 17)}" stroke-linecap="round" fill="none"/>`;
	});
	const mesh: string[] = [];
	for (let x = -260; x <= 260; x += 22) mesh.push(`M${x} -150V150`);
	for (let y = -150; y <= 150; y += 22) mesh.push(`M-260 ${y}H260`);
	return `<rect x="-300" y="-190" width="600" height="380" rx="60" fill="url(#dark)"/><rect x="-260" y="-150" width="520" height="300" rx="30" fill="#15191c"/>
	<path d="${mesh.join('')}" stroke="#a9b0b5" stroke-width="3" fill="none"/>${strands.join('')}
	<path d="M-40 -190v-260h80v260z" fill="url(#metal)"/>`;
}

function bolts(random: Random): string {
	const stretched = random.integer(0, 5);
	return (
		Array.from({ length: 6 }, (_, i) => {
			const longer = i === stretched ? 26 : 0;
			return `<g transform="translate(${-450 + i * 180} -180)"><rect x="-42" width="84" height="52" fill="url(#metal)"/><rect x="-22" y="52" width="44" height="${330 + longer}" fill="url(#metal)"/>
		<path d="${Array.from({ length: 16 }, (_, t) => `M-22 ${230 + t * 10}h44`).join('')}" stroke="#3c4146" stroke-width="3"/></g>`;
		}).join('') + '<rect x="-560" y="250" width="1120" height="46" fill="#d9d4c2"/>'
	);
}

function laidOut(random: Random): string {
	return Array.from({ length: 3 }, (_, c) =>
		[-170, 110]
			.map(
				(
					y,
					half
				) => `<g transform="translate(${-420 + c * 420} ${y})"><path d="M-130 40a130 130 0 0 1 260 0h-24a106 106 0 0 0 -212 0z" fill="url(#metal)"/>
			<path d="M150 -40h120v52h-120l-20 -26z" fill="#f6f1e2"/><text x="164" y="-8" font-family="monospace" font-size="22" fill="#16202b">${c + 1}${half === 0 ? 'u' : 'l'}</text>
			${c === 1 && half === 0 ? `<path d="M-60 -52q60 -${random.integer(18, 30)} 120 0v30q-60 -20 -120 0z" fill="#7d5a35" opacity=".85"/>` : ''}</g>`
			)
			.join('')
	).join('');
}

function stand(random: Random): string {
	return `<path d="M-420 -220h760l60 300h-880z" fill="url(#dark)"/><path d="M-420 80h820v130q-410 60 -820 0z" fill="#4f565b"/>
	<path d="M-500 330h1000v40H-500zM-460 210h50v130h-50zM410 210h50v130h-50z" fill="#2f6db0" opacity=".8"/>
	${Array.from({ length: 3 }, (_, i) => `<circle cx="${-260 + i * 240}" cy="-90" r="70" fill="#3a4045"/>`).join('')}
	<path d="M${random.integer(-300, 200)} 190q30 90 10 150" stroke="#1b1510" stroke-width="14" fill="none" opacity=".8"/>`;
}

import { certificateCaution, type CertificateFace } from '$lib/domain/certificates/face';
import { dayWords, howWords } from '$lib/domain/certificates/words';
import type { Flow } from './flow';
import { colour, paper, type Pen, type Style } from './pen';

const markPath = 'M5 2h22v5h-3v3h3v4h-3v3h3v4h-3v3h3v6H5v-6h3v-3H5v-4h3v-3H5v-4h3V7H5z';
const soft: Style = { font: 'body', sizePt: 10.5, colour: colour.soft, leadPt: 1.5 };
const small: Style = { font: 'body', sizePt: 8.5, colour: colour.soft, leadPt: 1 };

export function writeCertificate(flow: Flow, face: CertificateFace): void {
	const { root } = flow;
	head(flow, face);

	flow.heading('What was shown');
	flow.list(face.outcomes, { ring: true });

	flow.heading('At the bench', 60);
	flow.table(
		['Task', 'Engine', 'How', 'Judged competent'],
		face.tasks.map((task) => [
			task.title,
			task.engine,
			howWords(task),
			`${dayWords(task.decidedOn)}, attempt ${task.attempt}`
		]),
		[0.31, 0.21, 0.26, 0.22]
	);
	flow.heading('Not assessed');
	if (face.notAssessed.length > 0) flow.list(face.notAssessed);
	else flow.block(root, 'P', 'The course names nothing that it leaves out.');

	flow.heading('Why it was awarded');
	flow.block(root, 'P', `By the rule ${face.rule.name}: ${face.rule.words}`, small);
	flow.skip(4);
	flow.list(face.because);

	flow.heading('Caution', 26);
	flow.block(root, 'P', certificateCaution, { ...small, colour: colour.brass });
}

function head(flow: Flow, face: CertificateFace): void {
	const { pen, root } = flow;
	const nameWidthPt = 330;
	wordmark(pen, flow);
	flow.skip(30);
	flow.block(root, 'P', 'CERTIFICATE', {
		font: 'label',
		sizePt: 9,
		colour: colour.soft,
		spacingPt: 0.8
	});
	stamp(pen, flow, face);
	const name = nameStyle(pen, face.personName, nameWidthPt);
	const top = flow.at();
	const end = pen.say(root, 'H1', name, face.personName, {
		xPt: paper.leftPt,
		yPt: top,
		widthPt: nameWidthPt
	});
	flow.skip(end - top + 2);
	flow.block(
		root,
		'P',
		'has shown at the bench, and in writing, what is listed here, in the course',
		{
			...soft
		}
	);
	flow.skip(2);
	flow.block(root, 'P', face.course.title, { font: 'heading', sizePt: 20, colour: colour.layout });
	const school = face.school.place ? `${face.school.name}, ${face.school.place}` : face.school.name;
	flow.block(root, 'P', `at ${school}.`, soft);
	flow.skip(4);
}

/** A long name gets smaller before it takes a third line. */
function nameStyle(pen: Pen, name: string, widthPt: number): Style {
	const style: Style = { font: 'heading', sizePt: 34 };
	while (style.sizePt > 20 && pen.heightOf(style, name, widthPt) > style.sizePt * 2.6)
		style.sizePt -= 1;
	return style;
}

function wordmark(pen: Pen, flow: Flow): void {
	const { doc } = pen;
	const alt = 'Ringland, a piston with its ring grooves in section';
	pen.mark(pen.element(flow.root, 'Figure', { alt }), 'Figure', () => {
		doc.save();
		doc.translate(paper.leftPt - 3, flow.at() - 8).scale(0.62);
		doc.path(markPath).fill(colour.layout);
		doc.restore();
		pen.write({ font: 'heading', sizePt: 17 }, 'Ringland', paper.leftPt + 20, flow.at() - 8, 120);
	});
	pen.artifact(() => {
		doc.lineWidth(1.6);
		doc
			.moveTo(paper.leftPt, flow.at() + 18)
			.lineTo(paper.rightPt, flow.at() + 18)
			.stroke(colour.ink);
	});
}

/** The decision, slightly askew, as on paper. */
function stamp(pen: Pen, flow: Flow, face: CertificateFace): void {
	const { doc } = pen;
	const [xPt, yPt, widthPt, heightPt] = [404, flow.at() + 2, 132, 56] as const;
	pen.mark(pen.element(flow.root, 'P'), 'P', () => {
		doc.save();
		doc.rotate(-3, { origin: [xPt + widthPt / 2, yPt + heightPt / 2] });
		doc.lineWidth(1).rect(xPt, yPt, widthPt, heightPt).stroke(colour.chromate);
		doc
			.lineWidth(1)
			.rect(xPt + 3, yPt + 3, widthPt - 6, heightPt - 6)
			.stroke(colour.chromate);
		const big: Style = {
			font: 'heading',
			sizePt: 21,
			colour: colour.chromate,
			spacingPt: 1.4,
			centred: true
		};
		pen.write(big, 'AWARDED', xPt, yPt + 9, widthPt);
		const day: Style = { ...big, font: 'label', sizePt: 11, spacingPt: 0.3 };
		pen.write(day, dayWords(face.awardedOn), xPt, yPt + 33, widthPt);
		doc.restore();
	});
}

import type { Block } from './blocks';

/** The light theme's colours, written out: mail programs know no custom properties. */
const colour = {
	vellum: '#f6f3ea',
	sheet: '#fdfcf8',
	ink: '#16202b',
	soft: '#4b5966',
	rule: '#c9c6ba',
	layout: '#14407a'
};
const body = "'Atkinson Hyperlegible Next',Verdana,sans-serif";
const label = "'Barlow Condensed','Arial Narrow',Arial,sans-serif";
const figures = "'Spline Sans Mono',Consolas,monospace";

/** A letter as one sheet with its double border. No pictures, no scripts, nothing fetched. */
export function blocksAsHtml(title: string, from: string, blocks: readonly Block[]): string {
	return `<!doctype html>
<html lang="en"><head><meta charset="utf-8"><meta name="viewport" content="width=device-width"><title>${escaped(title)}</title></head>
<body style="margin:0;padding:16px;background:${colour.vellum};color:${colour.ink};font:16px/1.55 ${body}">
<main style="max-width:36rem;margin:0 auto;padding:4px;border:1px solid ${colour.rule}"><div style="padding:20px 24px;background:${colour.sheet};border:1px solid ${colour.ink}">
<p style="margin:0 0 16px;padding-bottom:8px;border-bottom:2px solid ${colour.ink};font:600 20px/1 ${label}">Ringland</p>
<h1 style="margin:0 0 12px;font:600 26px/1.15 ${label}">${escaped(title)}</h1>
${blocks.map(asHtml).join('\n')}
<p style="margin:24px 0 0;padding-top:8px;border-top:1px solid ${colour.ink};font:500 13px/1.3 ${label};letter-spacing:.06em;text-transform:uppercase;color:${colour.soft}">${escaped(from)}</p>
</div></main></body></html>
`;
}

function asHtml(block: Block): string {
	switch (block.kind) {
		case 'words':
			return `<p style="margin:0 0 12px">${escaped(block.words)}</p>`;
		case 'small':
			return `<p style="margin:16px 0 0;font-size:14px;color:${colour.soft}">${escaped(block.words)}</p>`;
		case 'link':
			return `<p style="margin:16px 0"><a href="${escaped(block.to)}" style="display:inline-block;padding:11px 18px;background:${colour.layout};color:${colour.sheet};font:600 17px/1 ${label};text-decoration:none;border-radius:2px">${escaped(block.words)}</a><br><span style="font-size:13px;color:${colour.soft};overflow-wrap:anywhere">${escaped(block.to)}</span></p>`;
		case 'list':
			return `<ul style="margin:0 0 12px;padding-left:20px">${block.lines.map((line) => `<li>${escaped(line)}</li>`).join('')}</ul>`;
		case 'figure':
			return `<p style="margin:0 0 12px"><span style="font:500 13px/1.2 ${label};letter-spacing:.06em;text-transform:uppercase;color:${colour.soft}">${escaped(block.label)}</span><br><span style="font-family:${figures}">${escaped(block.value)}</span></p>`;
	}
}

function escaped(text: string): string {
	return text.replace(/[&<>"']/g, (one) => `&#${one.charCodeAt(0)};`);
}

import { cannot, computed, type Outcome } from '../outcome';
import { judgeTool, type Asked, type ToolJudgement } from './tool';

export type Tool = { name: string; expanded: number };
export type ToolChoice = {
	/** In the order given. */
	judged: (Tool & { judgement: ToolJudgement })[];
	/** The one to fetch: the least fine that still can judge; undefined where none can. */
	fetch: string | undefined;
};

/**
 * Which tool to fetch: of those that can judge by these limits the least fine, since it is the
 * quickest to use and the finer ones are spared.
 * @param tools name and expanded uncertainty (k = 2) of each @param asked as for judgeTool
 * @returns each tool's judgement and the one to fetch
 * @example chooseTool([{ name: 'caliper', expanded: 0.03 }, { name: 'micrometer',
 *   expanded: 0.002 }], { least: 39.984, most: 40 }) // micrometer
 */
export function chooseTool(tools: readonly Tool[], asked: Asked): Outcome<ToolChoice> {
	if (tools.length === 0) return cannot('there is no tool to choose from');
	const judged: ToolChoice['judged'] = [];
	for (const tool of tools) {
		const judgement = judgeTool(tool.expanded, asked);
		if (!judgement.ok) return judgement;
		judged.push({ ...tool, judgement: judgement.value });
	}
	const able = judged
		.filter(({ judgement: { verdict } }) => verdict === 'yes' || verdict === 'easily')
		.toSorted((a, b) => b.expanded - a.expanded);
	return computed({ judged, fetch: able[0]?.name });
}

import type { AnyKind } from './kind';
import type { KindName } from './kind-names';
import { numberWithUnit } from './kinds/number-with-unit';
import { ruling } from './kinds/ruling';
import { severalChoices } from './kinds/several-choices';
import { singleChoice } from './kinds/single-choice';
import { tighteningOrder } from './kinds/tightening-order';

/** One line a kind; forgetting one does not compile. */
const kinds: Record<KindName, AnyKind> = {
	'single-choice': singleChoice as AnyKind,
	'several-choices': severalChoices as AnyKind,
	'number-with-unit': numberWithUnit as AnyKind,
	'tightening-order': tighteningOrder as AnyKind,
	ruling: ruling as AnyKind
};

export function kindOf(name: KindName): AnyKind {
	return kinds[name];
}

import { homes, layerOf, mayImport, pureAllowed } from './layers';
import { importsOf, type Import, type SourceFile } from './source-files';

/** What a file imports that the house forbids, in words. */
export function arrowFaults(file: SourceFile): string[] {
	const layer = layerOf(file.path);
	if (!layer) return [`${file.path} lies in no layer of the house`];
	return importsOf(file).flatMap((one) => {
		const words =
			one.target === undefined ? ofPackage(file.path, one) : ofOurs(file.path, one.target);
		return words ? [`${file.path} imports ${one.specifier}: ${words}`] : [];
	});
}

function ofOurs(from: string, target: string): string | undefined {
	const [layer, other] = [layerOf(from), layerOf(target)];
	if (!layer || !other) return 'it lies in no layer of the house';
	if (layer !== other && !mayImport[layer].includes(other)) return `${layer} may not use ${other}`;
	const [own, others] = [serviceFolder(from), serviceFolder(target)];
	if (others && layer === 'services' && own !== others)
		return 'no service folder uses another, and what they share uses none';
	return undefined;
}

const serviceFolder = (path: string) => /^src\/lib\/server\/services\/([^/]+)\//.exec(path)?.[1];

function ofPackage(from: string, { specifier }: Import): string | undefined {
	const layer = layerOf(from);
	if (layer === 'kernel' || layer === 'domain')
		return pureAllowed[layer].test(specifier) ? undefined : `${layer} stays pure`;
	if ((layer === 'ui' || layer === 'client') && specifier.startsWith('node:'))
		return 'a browser has no such thing';
	const home = homes.find(({ packages }) => packages.test(specifier));
	return home && !home.at.test(from) ? 'this package has its one place' : undefined;
}

/** Order matters: Edge and Opera also say Chrome, and Chrome also says Safari. */
const browsers: readonly (readonly [RegExp, string])[] = [
	[/\bEdgA?\//, 'Edge'],
	[/\bOPR\//, 'Opera'],
	[/\bSamsungBrowser\//, 'Samsung Internet'],
	[/\b(?:Firefox|FxiOS)\//, 'Firefox'],
	[/\b(?:Chrome|CriOS|HeadlessChrome)\//, 'Chrome'],
	[/\bSafari\//, 'Safari']
];
const systems: readonly (readonly [RegExp, string])[] = [
	[/\biPhone\b/, 'iPhone'],
	[/\biPad\b/, 'iPad'],
	[/\bAndroid\b/, 'Android'],
	[/\bWindows\b/, 'Windows'],
	[/\bCrOS\b/, 'Chromebook'],
	[/\bMac OS X\b/, 'Mac'],
	[/\bLinux\b/, 'Linux']
];

/** What a person recognises a device by: "Firefox on Linux". */
export function deviceWords(userAgent: string | null | undefined): string {
	const find = (list: readonly (readonly [RegExp, string])[]) =>
		list.find(([pattern]) => pattern.test(userAgent ?? ''))?.[1];
	const browser = find(browsers);
	const system = find(systems);
	if (browser && system) return `${browser} on ${system}`;
	return browser ?? (system ? `A browser on ${system}` : 'An unnamed device');
}

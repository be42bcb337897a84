/** What `src/bin/child-source.ts` makes of an entry: its bundled text, for `makeChild` to run. */
declare module '*?child' {
	const source: string;
	export default source;
}

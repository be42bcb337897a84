/** No mdsvex layout: the lesson page itself is the layout, which keeps lessons in runes mode. */
/** @type {import('mdsvex').MdsvexOptions} */
export default { extensions: ['.svx'], smartypants: true };

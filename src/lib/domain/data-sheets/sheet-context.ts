/** Under this key a page gives its lesson the data sheet (an object with `sheet`). */
export const sheetContext = 'ringland:data-sheet';

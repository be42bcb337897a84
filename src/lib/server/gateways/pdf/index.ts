export { makePdfPrinter, type PdfPrinter } from './pdf-printer';
export type { PrintQuestion } from './print-certificate';

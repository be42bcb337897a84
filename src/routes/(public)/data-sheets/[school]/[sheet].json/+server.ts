import { publicSheetFile } from '$lib/server/http/send-sheet';

export const GET = publicSheetFile('json');

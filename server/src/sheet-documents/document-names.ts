import type { SheetContent } from './sheet-content.types.js';
import { sheetStrings } from './sheet-strings.js';

/** The sheet's name as the title of a document. */
export const documentTitle = (content: SheetContent): string =>
  sheetStrings.documentTitle
    .replace('{title}', () => content.title)
    .replace('{code}', content.code)
    .replace('{number}', content.number);

/** What the document is about, for its metadata. */
export const documentSubject = (content: SheetContent): string =>
  sheetStrings.subject
    .replace('{title}', () => content.title)
    .replace('{temperature}', content.range.temperaturePrinted)
    .replace('{pressure}', content.range.pressurePrinted);

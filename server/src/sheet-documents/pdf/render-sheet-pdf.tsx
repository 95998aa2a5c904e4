import { renderToBuffer } from '@react-pdf/renderer';
import type { SheetContent } from '../sheet-content.types.js';
import { registerFonts } from './print-fonts.js';
import type { Paper } from './print-layout.js';
import { printable } from './printable.js';
import { SheetDocument } from './sheet-document.js';

export type { Paper } from './print-layout.js';

/**
 * The data sheet as PDF, from its content alone: vectors and embedded fonts, no bitmap.
 *
 * @throws when a chart draws with something the document cannot show
 */
export async function renderSheetPdf(content: SheetContent, paper: Paper = 'A4'): Promise<Buffer> {
  const { value, families } = printable(content);
  registerFonts(families);
  return renderToBuffer(<SheetDocument content={value} paper={paper} families={families} />);
}

import { StyleSheet } from '@react-pdf/renderer';
import { printPalette } from './print-palette.js';

const POINTS_PER_MM = 72 / 25.4;
const millimetres = (length: number): number => length * POINTS_PER_MM;

/** Sizes of paper, with the same column and margin on each. */
export const PAPERS = {
  A4: { size: 'A4', left: millimetres(19), right: millimetres(17), top: millimetres(17), bottom: millimetres(20) },
  LETTER: {
    size: 'LETTER',
    left: millimetres(22),
    right: millimetres(19.9),
    top: millimetres(14),
    bottom: millimetres(17),
  },
} as const;
export type Paper = keyof typeof PAPERS;

export const COLUMN_WIDTH = millimetres(128);
const GUTTER = millimetres(6);
const MARGIN_WIDTH = millimetres(40);

/** Styles of the printed sheet, in pt. */
export const styles = StyleSheet.create({
  // No line height here and in the footer: fixed text with one is lost by the renderer. Elsewhere it stands beside its font
  // size, of which it is a multiple; alone it would be a multiple of the renderer's 18 pt.
  page: { fontSize: 9.4, color: printPalette.ink },
  masthead: {
    flexDirection: 'row',
    justifyContent: 'space-between',
    alignItems: 'flex-end',
    borderBottomWidth: 1.6,
    borderBottomColor: printPalette.ink,
    paddingBottom: 5,
  },
  mastheadHair: { borderBottomWidth: 0.5, borderBottomColor: printPalette.ink, height: 3, marginBottom: 20 },
  wordmark: { fontSize: 15, fontWeight: 600, lineHeight: 1.1 },
  wordmarkQuantity: { fontStyle: 'italic', color: printPalette.accent },
  mastheadText: { fontSize: 8.4, color: printPalette.ink2 },
  banner: {
    borderTopWidth: 0.5,
    borderBottomWidth: 0.5,
    borderColor: printPalette.warn,
    color: printPalette.warn,
    fontWeight: 600,
    paddingVertical: 4,
    marginBottom: 14,
  },

  row: { flexDirection: 'row', marginBottom: 13 },
  column: { width: COLUMN_WIDTH, marginRight: GUTTER },
  margin: {
    width: MARGIN_WIDTH,
    fontSize: 7.8,
    lineHeight: 1.46,
    color: printPalette.ink2,
    borderTopWidth: 0.5,
    borderTopColor: printPalette.ink,
    paddingTop: 4.5,
  },
  marginEmpty: { width: MARGIN_WIDTH },
  marginLine: { flexDirection: 'row' },
  marginLabel: { width: millimetres(17), paddingRight: 2, color: printPalette.ink3 },
  marginValue: { flex: 1, color: printPalette.ink },
  marginParagraph: { marginBottom: 4 },

  title: { fontSize: 27, fontWeight: 300, lineHeight: 1.12, letterSpacing: -0.6 },
  lead: { fontSize: 11, lineHeight: 1.45, color: printPalette.ink2, marginTop: 7 },
  identity: { fontSize: 8.8, lineHeight: 1.48, color: printPalette.ink2, marginTop: 7 },
  strong: { fontWeight: 600, color: printPalette.ink },
  small: { fontSize: 8.4, lineHeight: 1.42, color: printPalette.ink2 },

  heading: { flexDirection: 'row', marginBottom: 6 },
  headingNumber: { fontSize: 11, lineHeight: 1.3, color: printPalette.ink3, width: 14 },
  headingText: { fontSize: 11, lineHeight: 1.3, fontWeight: 600 },
  caption: { fontSize: 8.2, lineHeight: 1.41, color: printPalette.ink2, marginTop: 4 },
  axisTitle: { fontSize: 8.2, lineHeight: 1.3 },
  remark: {
    fontSize: 8.4,
    lineHeight: 1.42,
    color: printPalette.ink2,
    borderLeftWidth: 0.8,
    borderLeftColor: printPalette.rule,
    paddingLeft: 8,
    marginTop: 6,
  },

  correlation: { flexDirection: 'row', alignItems: 'center' },
  equation: { flexDirection: 'row', alignItems: 'center', fontSize: 17, lineHeight: 1.25, width: millimetres(54) },
  fraction: { alignItems: 'center', marginHorizontal: 2 },
  fractionBar: { alignSelf: 'stretch', borderBottomWidth: 0.8, borderBottomColor: printPalette.ink },
  exponent: { fontSize: 11.5, alignSelf: 'flex-start', marginTop: -5, marginRight: 4 },
  parameters: { fontSize: 9, lineHeight: 1.49 },
  parameter: { flexDirection: 'row' },
  parameterLabel: { width: 44, flexShrink: 0, textAlign: 'right' },
  parameterSign: { width: 18, flexShrink: 0, textAlign: 'center' },

  table: { fontSize: 8.4, lineHeight: 1.31, borderTopWidth: 1, borderBottomWidth: 1, borderColor: printPalette.ink },
  tableHead: {
    flexDirection: 'row',
    alignItems: 'flex-end',
    fontSize: 7.8,
    borderBottomWidth: 0.5,
    borderBottomColor: printPalette.ink,
    paddingVertical: 3,
  },
  tableUnit: { color: printPalette.ink2, fontWeight: 400 },
  tableRow: { flexDirection: 'row', paddingVertical: 1.75 },
  tableFifthRow: { borderBottomWidth: 0.5, borderBottomColor: printPalette.rule },
  tableStrongRow: { fontWeight: 600 },
  tableNote: { fontSize: 8, lineHeight: 1.32, color: printPalette.ink2, paddingBottom: 2.5 },
  tableTitle: {
    fontWeight: 600,
    paddingTop: 6,
    paddingBottom: 1,
    borderTopWidth: 0.5,
    borderTopColor: printPalette.rule,
  },

  keys: { marginTop: 2 },
  key: { flexDirection: 'row', marginBottom: 0.5 },
  keyMark: { width: 19, height: 10, marginTop: 0.8 },
  keyText: { flex: 1 },

  paragraph: { marginBottom: 2.5 },
  caution: { flexDirection: 'row', fontSize: 9, lineHeight: 1.4, marginBottom: 2.2 },
  cautionMark: { width: 15.5, color: printPalette.warn },
  cautionText: { flex: 1 },
  citation: {
    fontSize: 9.4,
    lineHeight: 1.42,
    borderLeftWidth: 0.8,
    borderLeftColor: printPalette.ink3,
    paddingLeft: 11,
  },

  footer: { position: 'absolute', flexDirection: 'row', fontSize: 7.5, color: printPalette.ink2 },
  footerName: { width: millimetres(64) },
  footerHash: { flex: 1 },
  footerPage: { width: millimetres(30), textAlign: 'right' },
  watermark: {
    position: 'absolute',
    top: 0,
    bottom: 0,
    left: 0,
    right: 0,
    justifyContent: 'center',
    alignItems: 'center',
  },
  watermarkText: {
    fontSize: 104,
    fontWeight: 600,
    color: printPalette.ink,
    opacity: 0.06,
    transform: 'rotate(-52deg)',
  },
});

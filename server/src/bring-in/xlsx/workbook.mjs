// @ts-check
import { damaged, Refused } from './archive.mjs';
import { readXml } from './xml.mjs';

/**
 * What a workbook says beside its sheets: SpreadsheetML, ISO/IEC 29500-1, part "Spreadsheet".
 *
 * @typedef {object} Workbook
 * @property {{ name: string, path: string }[]} sheets visible ones, in order
 * @property {boolean} from1904 days are counted from 1904-01-01
 * @property {boolean[]} isDate by index of a cell's format
 * @property {string[]} shared shared texts
 */

/**
 * @param {import('./archive.mjs').Archive} archive
 * @returns {Promise<Workbook>}
 */
export async function readWorkbook(archive) {
  if (!archive.has('xl/workbook.xml')) {
    throw new Refused('NOT_A_TABLE', 'This archive is not a workbook: it holds no sheets. Bring in XLSX, CSV or text.');
  }
  const targets = await readRelationships(archive);
  const { sheets, from1904 } = await readSheetList(archive, targets);
  return { sheets, from1904, isDate: await readDateFormats(archive), shared: await readSharedTexts(archive) };
}

/**
 * @param {import('./archive.mjs').Archive} archive
 * @param {string} name
 * @param {import('./xml.mjs').XmlHandlers} handlers
 */
async function readPart(archive, name, handlers) {
  if (archive.has(name)) await readXml(archive.text(name), handlers);
}

/** @param {import('./archive.mjs').Archive} archive */
async function readRelationships(archive) {
  /** @type {Map<string, string>} */
  const targets = new Map();
  await readPart(archive, 'xl/_rels/workbook.xml.rels', {
    open(name, { Id, Target }) {
      if (name !== 'Relationship' || Id === undefined || Target === undefined) return;
      targets.set(Id, Target.startsWith('/') ? Target.slice(1) : `xl/${Target}`);
    },
  });
  return targets;
}

/**
 * @param {import('./archive.mjs').Archive} archive
 * @param {Map<string, string>} targets
 */
async function readSheetList(archive, targets) {
  /** @type {{ name: string, path: string }[]} */
  const sheets = [];
  let from1904 = false;
  await readPart(archive, 'xl/workbook.xml', {
    open(name, attributes) {
      if (name === 'workbookPr') from1904 = ['1', 'true'].includes(attributes.date1904 ?? '');
      if (name !== 'sheet' || (attributes.state ?? 'visible') !== 'visible') return;
      const id = Object.entries(attributes).find(([key]) => key.endsWith(':id'))?.[1] ?? '';
      const path = targets.get(id);
      if (path !== undefined && archive.has(path)) sheets.push({ name: attributes.name ?? '', path });
    },
  });
  if (sheets.length === 0) throw damaged();
  return { sheets, from1904 };
}

/** Number formats 14–22 and 45–47 are dates and times (ISO/IEC 29500-1, section 18.8.30). */
const BUILT_IN_DATES = new Set([14, 15, 16, 17, 18, 19, 20, 21, 22, 45, 46, 47]);

/** @param {string} code of a number format */
const formatsDate = (code) => /[dmyhs]/i.test(code.replace(/"[^"]*"|\[[^\]]*\]|\\.|_./g, '').replace(/general/gi, ''));

/** @param {import('./archive.mjs').Archive} archive */
async function readDateFormats(archive) {
  /** @type {Map<number, boolean>} */
  const custom = new Map();
  /** @type {boolean[]} */
  const isDate = [];
  let inCellFormats = false;
  await readPart(archive, 'xl/styles.xml', {
    open(name, { numFmtId, formatCode }) {
      if (name === 'numFmt') custom.set(Number(numFmtId), formatsDate(formatCode ?? ''));
      if (name === 'cellXfs') inCellFormats = true;
      if (name !== 'xf' || !inCellFormats) return;
      const id = Number(numFmtId ?? 0);
      isDate.push(custom.get(id) ?? BUILT_IN_DATES.has(id));
    },
    close(name) {
      if (name === 'cellXfs') inCellFormats = false;
    },
  });
  return isDate;
}

/** @param {import('./archive.mjs').Archive} archive */
async function readSharedTexts(archive) {
  /** @type {string[]} */
  const shared = [];
  let text = '';
  let inText = false;
  let inReading = false;
  await readPart(archive, 'xl/sharedStrings.xml', {
    open(name) {
      if (name === 'si') text = '';
      if (name === 'rPh') inReading = true;
      inText = name === 't' && !inReading;
    },
    text(piece) {
      if (inText) text += piece;
    },
    close(name) {
      if (name === 't') inText = false;
      if (name === 'rPh') inReading = false;
      if (name === 'si') shared.push(text);
    },
  });
  return shared;
}

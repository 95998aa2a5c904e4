import { Document, Page, Text, View } from '@react-pdf/renderer';
import { documentSubject, documentTitle } from '../document-names.js';
import { formatShort, withUnit } from '../format-quantity.js';
import type { SheetContent } from '../sheet-content.types.js';
import { sheetStrings } from '../sheet-strings.js';
import { plain } from '../typeset.js';
import { StateMark } from './marks.js';
import { PrintCorrelation } from './print-equation.js';
import { DeviationSection, DiffusivitySection } from './print-figures.js';
import { PAPERS, styles, type Paper } from './print-layout.js';
import { Paragraphs, PrintRowWithMargin, PrintSection } from './print-section.js';
import {
  EstimatesTable,
  ExcludedPointsTable,
  RecommendedTable,
  SeriesTable,
  VersionsTable,
  assignedNote,
} from './print-tables.js';
import { Runs } from './typeset-text.js';

interface SheetDocumentProps {
  readonly content: SheetContent;
  readonly paper: Paper;
  /** In which glyphs are looked for, in this order */
  readonly families: string[];
}

/** The data sheet as a document worth printing, from its content alone. */
export function SheetDocument({ content, paper, families }: SheetDocumentProps) {
  const { size, left, right, top, bottom } = PAPERS[paper];
  const page = { fontFamily: families, paddingLeft: left, paddingRight: right, paddingTop: top, paddingBottom: bottom };
  const issuedAt = content.versions.find(({ isThis }) => isThis)?.date ?? null;
  return (
    <Document
      title={documentTitle(content)}
      author={sheetStrings.publisher}
      subject={documentSubject(content)}
      language="en"
      creator={sheetStrings.publisher}
      producer={sheetStrings.publisher}
      // The day of issue, not of printing: the same sheet is the same file.
      {...(issuedAt === null ? {} : { creationDate: new Date(issuedAt), modificationDate: new Date(issuedAt) })}
    >
      <Page size={size} style={[styles.page, page]}>
        <Watermark word={content.standing.watermark} />
        <Footer content={content} left={left} right={right} />
        <Masthead content={content} />
        <TitleSection content={content} />
        <CorrelationSection content={content} />
        <DiffusivitySection content={content} />
        <DeviationSection content={content} />
        <RecommendedSection content={content} />
        <SeriesSection content={content} />
        <EstimatesSection content={content} />
        <UncertaintySection content={content} />
        <CautionsSection content={content} />
        <CitationSection content={content} />
        <VersionsSection content={content} />
      </Page>
    </Document>
  );
}

interface ContentProps {
  readonly content: SheetContent;
}

/** The word of a state that is no release, behind the text of every page. */
function Watermark({ word }: { readonly word: string | null }) {
  if (word === null) return null;
  return (
    <View fixed style={styles.watermark}>
      <Text style={styles.watermarkText}>{word}</Text>
    </View>
  );
}

const HASH_DIGITS = 24;
const hashInGroups = (hash: string): string => (hash.slice(0, HASH_DIGITS).match(/.{4}/g) ?? []).join(' ');

function Footer({ content, left, right }: ContentProps & { readonly left: number; readonly right: number }) {
  const { title, number, standing } = content;
  const name = sheetStrings.running
    .replace('{title}', () => title)
    .replace('{number}', number)
    .replace('{state}', standing.word);
  return (
    <View fixed style={[styles.footer, { left, right, bottom: 26 }]}>
      <Text style={styles.footerName}>{name}</Text>
      <Text style={styles.footerHash}>
        {standing.contentHash === null ? '' : `SHA-256 ${hashInGroups(standing.contentHash)} …`}
      </Text>
      <Text
        style={styles.footerPage}
        render={({ pageNumber, totalPages }) =>
          sheetStrings.pageOf.replace('{page}', String(pageNumber)).replace('{pages}', String(totalPages))
        }
      />
    </View>
  );
}

function Masthead({ content }: ContentProps) {
  const { code, number, standing } = content;
  const text = sheetStrings.masthead
    .replace('{code}', code)
    .replace('{number}', number)
    .replace('{state}', standing.word);
  return (
    <View>
      <View style={styles.masthead}>
        <Text style={styles.wordmark}>
          <Text style={styles.wordmarkQuantity}>{sheetStrings.publisher.slice(0, 1)}</Text>
          {sheetStrings.publisher.slice(1)}
        </Text>
        <Text style={styles.mastheadText}>{text}</Text>
      </View>
      <View style={styles.mastheadHair} />
      {standing.banner !== null && <Text style={styles.banner}>{standing.banner}</Text>}
    </View>
  );
}

function TitleSection({ content }: ContentProps) {
  return (
    <PrintRowWithMargin margin={<TitleMargin content={content} />}>
      <Text style={styles.title}>{content.title}</Text>
      <Text style={styles.lead}>
        <Runs runs={content.lead} size={11} />
      </Text>
      {content.summary !== '' && <Text style={styles.identity}>{content.summary}</Text>}
      {content.substances.map(({ name, formula, casNumber, molarMass }, i) => (
        <Text key={i} style={[styles.identity, { marginTop: i === 0 ? 7 : 0 }]}>
          <Text style={styles.strong}>{name}</Text>
          <Runs runs={formula.length === 0 ? [] : [...plain(' '), ...formula]} size={8.8} />
          {casNumber === null ? '' : `, ${casNumber}`}
          {`, ${withUnit(formatShort(1000 * molarMass), 'g/mol')}`}
        </Text>
      ))}
      <Text style={[styles.small, { marginTop: 7 }]}>
        <Runs runs={content.definition} size={8.4} />
      </Text>
    </PrintRowWithMargin>
  );
}

function TitleMargin({ content }: ContentProps) {
  const { standing, margin } = content;
  return (
    <>
      <View style={styles.marginLine}>
        <Text style={styles.marginLabel}>{sheetStrings.margin.state}</Text>
        <StateMark status={standing.status} word={standing.word} />
      </View>
      {margin.entries.map(({ label, value }, i) => (
        <View key={i} style={styles.marginLine}>
          <Text style={styles.marginLabel}>
            <Runs runs={label} size={7.8} />
          </Text>
          <Text style={styles.marginValue}>{value}</Text>
        </View>
      ))}
    </>
  );
}

function CorrelationSection({ content }: ContentProps) {
  return (
    <PrintSection content={content} id="correlation" margin={<Paragraphs paragraphs={content.margin.fit} size={7.8} />}>
      <PrintCorrelation correlation={content.correlation} />
      <Text style={[styles.small, { marginTop: 6 }]}>
        <Runs runs={content.range.sentence} size={8.4} />
      </Text>
    </PrintSection>
  );
}

const STATED_BESIDE_TABLE = 2;

function RecommendedSection({ content }: ContentProps) {
  const notes = [content.recommended.note, ...content.uncertainty.statement.slice(0, STATED_BESIDE_TABLE)];
  return (
    <PrintSection content={content} id="recommended" margin={<Paragraphs paragraphs={notes} size={7.8} />}>
      <RecommendedTable content={content} />
    </PrintSection>
  );
}

function SeriesSection({ content }: ContentProps) {
  const star = assignedNote(content);
  const notes = star === null ? content.margin.series : [...content.margin.series, star];
  return (
    <PrintSection content={content} id="series" wrap margin={<Paragraphs paragraphs={notes} size={7.8} />}>
      <SeriesTable content={content} />
      {content.pointsLeftOut.length > 0 && (
        <View style={{ marginTop: 8 }}>
          <Text style={[styles.small, styles.strong, { marginBottom: 2 }]} minPresenceAhead={40}>
            {sheetStrings.pointsLeftOut}
          </Text>
          <ExcludedPointsTable content={content} />
        </View>
      )}
    </PrintSection>
  );
}

function EstimatesSection({ content }: ContentProps) {
  const { methods, note } = content.estimates;
  return (
    <PrintSection
      content={content}
      id="estimates"
      {...(methods.length === 0 ? {} : { margin: <Paragraphs paragraphs={[note]} size={7.8} /> })}
    >
      {methods.length === 0 ? (
        <Text style={styles.small}>
          <Runs runs={note} size={8.4} />
        </Text>
      ) : (
        <EstimatesTable content={content} />
      )}
    </PrintSection>
  );
}

function UncertaintySection({ content }: ContentProps) {
  // The first two paragraphs stand beside the table they explain.
  const { statement, notIncluded } = content.uncertainty;
  return (
    <PrintSection content={content} id="uncertainty">
      {[...statement.slice(STATED_BESIDE_TABLE), ...notIncluded].map((runs, i) => (
        <Text key={i} style={[styles.small, styles.paragraph]}>
          <Runs runs={runs} size={8.4} />
        </Text>
      ))}
    </PrintSection>
  );
}

function CautionsSection({ content }: ContentProps) {
  return (
    <PrintSection content={content} id="cautions">
      {content.cautions.map((runs, i) => (
        <View key={i} style={styles.caution}>
          <Text style={styles.cautionMark}>—</Text>
          <Text style={styles.cautionText}>
            <Runs runs={runs} size={9} />
          </Text>
        </View>
      ))}
    </PrintSection>
  );
}

function CitationSection({ content }: ContentProps) {
  return (
    <PrintSection content={content} id="citation">
      <Text style={styles.citation}>
        <Runs runs={content.citation.runs} size={9.4} />
      </Text>
    </PrintSection>
  );
}

/** A longer table is parted between two pages. */
const MOST_ROWS_TOGETHER = 12;

function VersionsSection({ content }: ContentProps) {
  return (
    <PrintSection content={content} id="versions" wrap={content.versions.length > MOST_ROWS_TOGETHER}>
      <VersionsTable content={content} />
    </PrintSection>
  );
}

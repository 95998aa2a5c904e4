import { Text, View } from '@react-pdf/renderer';
import { formatQuantity } from '../format-quantity.js';
import type { SheetContent } from '../sheet-content.types.js';
import { sheetStrings } from '../sheet-strings.js';
import { plain, typeset } from '../typeset.js';
import type { TextRun } from '../typeset.types.js';
import { CHART_WIDTH, deviationChart, diffusivityChart, estimateStroke } from './figure-charts.js';
import { Key, LineKey, SeriesMarkKey } from './marks.js';
import { printPalette } from './print-palette.js';
import { COLUMN_WIDTH, styles } from './print-layout.js';
import { Paragraphs, PrintRowWithMargin, PrintSection } from './print-section.js';
import { Runs } from './typeset-text.js';
import { VectorChart } from './vector-chart.js';

const { axes, figureKeys } = sheetStrings;
const MARGIN_SIZE = 7.8;
const CAPTION_SIZE = 8.2;
const HEIGHTS = { diffusivity: 306, deviation: 244 } as const;

const fitLabelOf = ({ margin }: SheetContent): string => figureKeys.fit.replace('{number}', margin.fitNumber);

/** Figure 1 with the keys of its series and lines in the margin. */
export function DiffusivitySection({ content }: { readonly content: SheetContent }) {
  const { figures } = content;
  const fitLabel = fitLabelOf(content);
  return (
    <PrintSection content={content} id="figures" margin={<FigureKeys content={content} fitLabel={fitLabel} />}>
      <Figure
        number={1}
        svg={diffusivityChart(figures, fitLabel, HEIGHTS.diffusivity)}
        axisTitle={typeset(axes.diffusivity, { pressure: formatQuantity('pressure', figures.pressure) })}
        caption={figures.diffusivityCaption}
      />
    </PrintSection>
  );
}

/** Figure 2. */
export function DeviationSection({ content }: { readonly content: SheetContent }) {
  const { figures, margin } = content;
  return (
    <PrintRowWithMargin
      margin={
        <>
          <Paragraphs paragraphs={margin.figures} size={MARGIN_SIZE} />
          <DeviationKeys content={content} />
        </>
      }
    >
      <Figure
        number={2}
        svg={deviationChart(figures, HEIGHTS.deviation)}
        axisTitle={typeset(axes.deviation)}
        caption={figures.deviationCaption}
      />
    </PrintRowWithMargin>
  );
}

interface FigureProps {
  readonly number: number;
  readonly svg: string;
  readonly axisTitle: readonly TextRun[];
  readonly caption: readonly TextRun[];
}

function Figure({ number, svg, axisTitle, caption }: FigureProps) {
  const scale = COLUMN_WIDTH / CHART_WIDTH;
  return (
    <View>
      <Text style={styles.axisTitle}>
        <Runs runs={axisTitle} size={CAPTION_SIZE} />
      </Text>
      <View>
        <VectorChart svg={svg} width={COLUMN_WIDTH} />
        {/* The title of the lower axis, level with its figures. */}
        <Text style={[styles.axisTitle, { position: 'absolute', right: 12 * scale, bottom: 5.2 * scale }]}>
          <Runs runs={typeset(axes.temperature)} size={CAPTION_SIZE} />
        </Text>
      </View>
      <Text style={styles.caption}>
        <Text style={styles.strong}>{sheetStrings.figureTitle.replace('{number}', String(number))}</Text>
        <Runs runs={[...plain(' '), ...caption]} size={CAPTION_SIZE} />
      </Text>
    </View>
  );
}

function FigureKeys({ content, fitLabel }: { readonly content: SheetContent; readonly fitLabel: string }) {
  const { series } = content.figures;
  return (
    <View style={styles.keys}>
      {series.map(({ key, mark, title, used }) => (
        <Key key={key} mark={<SeriesMarkKey mark={mark} isOpen={!used} />}>
          {used ? `${key}, ${title}` : figureKeys.leftOut.replace('{key}', () => `${key}, ${title}`)}
        </Key>
      ))}
      <View style={{ height: 4 }} />
      <Key mark={<LineKey colour={printPalette.accent} width={1.8} />}>{fitLabel}</Key>
      <Key mark={<LineKey colour={printPalette.band} width={0} isBand />}>
        <Runs runs={typeset(figureKeys.band)} size={MARGIN_SIZE} />
      </Key>
    </View>
  );
}

/** Lines that only the second figure has. */
function DeviationKeys({ content }: { readonly content: SheetContent }) {
  const { estimates, curve } = content.figures;
  return (
    <View style={styles.keys}>
      {curve.relativeNewLaboratory !== null && (
        <Key mark={<LineKey colour={printPalette.accent} width={1.2} dash={[1.5, 2.5]} />}>
          {figureKeys.newLaboratory}
        </Key>
      )}
      {estimates.map(({ method }, i) => (
        <Key key={method} mark={<LineKey {...estimateStroke(i)} />}>
          {method}
        </Key>
      ))}
    </View>
  );
}

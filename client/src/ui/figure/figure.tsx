import { chakra, useSlotRecipe } from '@chakra-ui/react';
import { useId, useState, type ReactNode } from 'react';
import { saveCsv, saveFile, type PlainTable } from '../../lib/delimited';
import { uiStrings } from '../../strings/ui';
import { Failed } from '../feedback/states';
import { WordButton } from '../form/button';
import { figureRecipe } from '../recipes/content.recipe';
import { DataTable, type DataColumn } from '../table/data-table';
import { Plot, type ChosenBy } from './plot';
import { type FigureSpec } from './spec';

interface FigureProps {
  readonly number: number;
  readonly caption: ReactNode;
  /** What is seen, in a sentence, for those who do not see it. */
  readonly description: string;
  readonly spec: FigureSpec;
  /** The figure's numbers, for Data and CSV. */
  readonly data: PlainTable;
  /** Stem of the names of saved files. */
  readonly file: string;
  /** A point in words: its series, T, P, D, deviation. */
  readonly reading: (pointId: string) => ReactNode;
  /** The point chosen, where the page keeps it. */
  readonly selected?: string | null;
  readonly onSelect?: (pointId: string | null, by: ChosenBy) => void;
  readonly keys?: ReactNode;
  /** No caption and tools: the page shows them itself. */
  readonly bare?: boolean;
  /** Of a bare figure: its data are shown as a table. */
  readonly dataOpen?: boolean;
}

/** The one frame of every figure: caption, tools, drawing, reading, keys, and its data as a table. */
export function Figure({
  number,
  caption,
  description,
  spec,
  data,
  file,
  reading,
  selected,
  onSelect,
  keys,
  bare = false,
  dataOpen = false,
}: FigureProps) {
  const styles = useSlotRecipe({ recipe: figureRecipe })();
  const [dataShown, setDataShown] = useState(false);
  const [own, setOwn] = useState<string | null>(null);
  const chosen = selected === undefined ? own : selected;
  const captionId = useId();
  return (
    <chakra.figure css={styles.root} {...(bare ? { 'aria-label': description } : { 'aria-labelledby': captionId })}>
      {!bare && (
        <chakra.div css={styles.bar}>
          <chakra.figcaption css={styles.caption} id={captionId}>
            <b>{`${uiStrings.figure} ${number}.`}</b> {caption}
          </chakra.figcaption>
          <FigureTools
            spec={spec}
            data={data}
            file={file}
            number={number}
            dataShown={dataShown}
            onData={setDataShown}
          />
        </chakra.div>
      )}
      {/* The reading stands above the drawing: a sentence, not a floating box. */}
      {hasPoints(spec) && (
        <chakra.div css={styles.reading} role="status">
          {chosen === null ? <chakra.span color="ink3">{uiStrings.readingHint}</chakra.span> : reading(chosen)}
        </chakra.div>
      )}
      <Plot spec={spec} description={description} selected={chosen} onSelect={onSelect ?? setOwn} />
      {keys}
      {(dataShown || dataOpen) && (
        <chakra.div css={styles.data}>
          <FigureData data={data} file={file} label={`${uiStrings.figure} ${number}`} />
        </chakra.div>
      )}
    </chakra.figure>
  );
}

const hasPoints = ({ panels }: FigureSpec): boolean =>
  panels.some(({ marks }) => marks.some(({ kind }) => kind === 'points'));

interface ToolsProps {
  readonly spec: FigureSpec;
  readonly data: PlainTable;
  readonly file: string;
  readonly number: number;
  readonly dataShown: boolean;
  readonly onData: (shown: boolean) => void;
}

/** Data, SVG, PNG, CSV as words. */
export function FigureTools({ spec, data, file, number, dataShown, onData }: ToolsProps) {
  const styles = useSlotRecipe({ recipe: figureRecipe })();
  const [failed, setFailed] = useState(false);
  const of = (what: string) => ({ 'aria-label': `${what}: ${uiStrings.figure} ${number}` });
  const save = async (format: 'svg' | 'png') => {
    try {
      const { picturePng, pictureSvg } = await import('./picture');
      if (format === 'svg') saveFile(`${file}.svg`, (await pictureSvg(spec)).svg, 'image/svg+xml');
      else saveFile(`${file}.png`, await picturePng(spec));
    } catch {
      setFailed(true);
    }
  };
  return (
    <chakra.div css={styles.tools}>
      <WordButton quiet aria-expanded={dataShown} {...of(uiStrings.data)} onClick={() => onData(!dataShown)}>
        {dataShown ? uiStrings.hideData : uiStrings.data}
      </WordButton>
      <WordButton quiet {...of('SVG')} onClick={() => void save('svg')}>
        SVG
      </WordButton>
      <WordButton quiet {...of('PNG')} onClick={() => void save('png')}>
        PNG
      </WordButton>
      <WordButton quiet {...of('CSV')} onClick={() => saveCsv(file, data)}>
        CSV
      </WordButton>
      {failed && <Failed what="Not saved." why="The picture could not be made in this browser." />}
    </chakra.div>
  );
}

type Row = readonly (string | number | null)[];

function FigureData({
  data,
  file,
  label,
}: {
  readonly data: PlainTable;
  readonly file: string;
  readonly label: string;
}) {
  const rows = data.rows.map((cells, index) => ({ cells, index }));
  const columns = data.head.map((name, i): DataColumn<{ cells: Row; index: number }> => ({
    id: name,
    head: name,
    name,
    numeric: data.rows.some(({ [i]: cell }) => typeof cell === 'number'),
    value: ({ cells }) => cells[i] ?? null,
  }));
  return <DataTable label={label} columns={columns} rows={rows} rowId={({ index }) => String(index)} file={file} />;
}

import { useMemo, useState, type ReactNode } from 'react';
import { fill } from '../../lib/fill';
import { useReaderUnits } from '../../lib/units';
import { fitStrings } from '../../strings/fits';
import { Figure, FigureTools } from '../../ui/figure/figure';
import { FigureKeys } from '../../ui/figure/keys';
import { type ChosenBy } from '../../ui/figure/plot';
import { Views } from '../../ui/form/views';
import { Typeset } from '../../ui/numbers/typeset';
import { Section } from '../../ui/page/section';
import { type ChoiceAction } from './choice';
import { type PairPoint, type PairSeries } from './pair-series';
import { PointReading } from './point-reading';
import { ReasonForm } from './reason-form';
import {
  estimateStyle,
  pressureWords,
  workspaceFigure,
  workspaceTable,
  type LowerView,
  type Picture,
} from './workspace-figure';

const words = fitStrings.picture;
const PANEL = 'picture-panel';

interface PictureSectionProps {
  readonly title: string;
  readonly picture: Omit<Picture, 'view'>;
  /** Names of the estimates, in the order of the picture. */
  readonly estimateNames: readonly string[];
  readonly pointsOut: Readonly<Record<string, string>>;
  readonly dispatch: (action: ChoiceAction) => void;
  readonly margin: ReactNode;
}

/** The stacked picture: a point is read by passing over it, held by pressing it, and left out with a reason. */
export function PictureSection({ title, picture, estimateNames, pointsOut, dispatch, margin }: PictureSectionProps) {
  const units = useReaderUnits();
  const [view, setView] = useState<LowerView>('deviations');
  const [dataShown, setDataShown] = useState(false);
  const [asking, setAsking] = useState<string | null>(null);
  const { selected, held, select, letGo } = useSelection();
  const whole = useMemo(() => ({ ...picture, view }), [picture, view]);
  const spec = useMemo(() => workspaceFigure(whole, units), [whole, units]);
  const data = useMemo(() => workspaceTable(whole, units), [whole, units]);
  const counts = {
    title,
    pressure: pressureWords(picture.referencePressure, units),
    points: data.rows.length,
    series: picture.series.length,
  };
  const asked = asking === null ? null : findPoint(picture.series, asking);
  return (
    <Section number={1} title={words.title} id="picture" tight margin={margin}>
      <Views
        label={words.views}
        controls={PANEL}
        value={view}
        onChange={setView}
        options={[
          { value: 'deviations', label: words.deviations },
          { value: 'residuals', label: <Typeset>{words.residuals}</Typeset> },
        ]}
      >
        <FigureTools spec={spec} data={data} file="workspace" number={1} dataShown={dataShown} onData={setDataShown} />
      </Views>
      {asked !== null && (
        <ReasonForm
          key={asking}
          title={`${fill(words.point, { letter: asked.series.letter, number: asked.point.number })}: ${fitStrings.reason.pointTitle}`}
          given={pointsOut[asked.point.id] ?? null}
          onCancel={() => setAsking(null)}
          onGive={(reason) => {
            dispatch({ type: 'leaveOutPoint', id: asked.point.id, reason });
            setAsking(null);
          }}
        />
      )}
      <div id={PANEL} role="tabpanel" aria-label={words.views}>
        <Figure
          bare
          number={1}
          caption={title}
          description={fill(words.description, counts)}
          spec={spec}
          data={data}
          file="workspace"
          dataOpen={dataShown}
          selected={selected}
          onSelect={select}
          reading={(id) => {
            const found = findPoint(picture.series, id);
            return (
              found && (
                <PointReading
                  {...found}
                  reason={pointsOut[id] ?? null}
                  actions={{
                    held: held !== null,
                    onAsk: () => setAsking(id),
                    onTakeIn: () => dispatch({ type: 'takeInPoint', id }),
                    onLetGo: letGo,
                  }}
                />
              )
            );
          }}
          keys={<Keys picture={picture} estimateNames={estimateNames} />}
        />
      </div>
    </Section>
  );
}

/** A point that is pressed, or walked to by a key, is held: passing over others does not take it away. */
function useSelection() {
  const [hovered, setHovered] = useState<string | null>(null);
  const [held, setHeld] = useState<string | null>(null);
  const select = (id: string | null, by: ChosenBy) => {
    if (by === 'hover') setHovered(id);
    else setHeld(by === 'press' && id === held ? null : id);
    if (id === null) setHovered(null);
  };
  const letGo = () => {
    setHeld(null);
    setHovered(null);
  };
  return { selected: held ?? hovered, held, select, letGo };
}

function findPoint(
  all: readonly PairSeries[],
  id: string,
): { readonly series: PairSeries; readonly point: PairPoint } | null {
  for (const series of all) {
    const point = series.points.find((candidate) => candidate.id === id);
    if (point !== undefined) return { series, point };
  }
  return null;
}

function Keys({
  picture,
  estimateNames,
}: {
  readonly picture: Omit<Picture, 'view'>;
  readonly estimateNames: readonly string[];
}) {
  const { curve } = picture;
  return (
    <FigureKeys
      lines={[
        ...(curve === null
          ? []
          : [
              { kind: 'fit' as const, name: words.keys.now },
              { kind: 'band' as const, name: <Typeset>{words.keys.band}</Typeset> },
            ]),
        ...(curve?.newLaboratory ? [{ kind: 'prediction' as const, name: words.keys.newLaboratory }] : []),
        ...estimateNames.map((name, i) => ({ kind: estimateStyle(i), name })),
      ]}
    />
  );
}

import { chakra, useSlotRecipe } from '@chakra-ui/react';
import { useEffect, useMemo, useRef, useState, type KeyboardEvent, type PointerEvent } from 'react';
import { useEdition } from '../../lib/edition';
import { figureRecipe } from '../recipes/content.recipe';
import { useElementWidth } from '../use-element-width';
import { figureLayout, nearestPoint, placedPoints, type FigureLayout, type PlacedPoint } from './layout';
import { looks } from './look';
import { figureOption } from './option';
import { type FigureSpec } from './spec';
import { useNearScreen } from './use-near-screen';

/** How a point was chosen: passed over by the mouse, pressed, or walked to by a key. */
export type ChosenBy = 'hover' | 'press' | 'key';

interface PlotProps {
  readonly spec: FigureSpec;
  readonly description: string;
  readonly selected: string | null;
  readonly onSelect: (pointId: string | null, by: ChosenBy) => void;
}

/** The drawing itself, redrawn for its width; pointer, touch and arrow keys choose a point. */
export function Plot({ spec, description, selected, onSelect }: PlotProps) {
  const styles = useSlotRecipe({ recipe: figureRecipe })();
  const [width, widthRef] = useElementWidth(896);
  const layout = useMemo(() => figureLayout(spec, width), [spec, width]);
  const points = useMemo(() => placedPoints(spec, layout), [spec, layout]);

  const choose = (event: PointerEvent<HTMLDivElement>, by: ChosenBy) => {
    const box = event.currentTarget.getBoundingClientRect();
    const near = nearestPoint(points, event.clientX - box.left, event.clientY - box.top);
    if (near !== null) onSelect(near.point.id, by);
  };
  const walk = (event: KeyboardEvent) => {
    const next = nextPoint(event.key, points, selected);
    if (next === undefined) return;
    event.preventDefault();
    onSelect(next, 'key');
  };
  return (
    <chakra.div css={styles.plot} ref={widthRef} style={{ minHeight: layout.height }}>
      <chakra.div
        role="img"
        aria-label={description}
        tabIndex={0}
        onKeyDown={walk}
        onPointerMove={(event) => event.pointerType === 'mouse' && choose(event, 'hover')}
        onPointerDown={(event) => choose(event, 'press')}
        width="100%"
        style={{ height: layout.height }}
      >
        <Drawing spec={spec} layout={layout} />
      </chakra.div>
      <Cross layout={layout} chosen={points.filter((placed) => placed.point.id === selected)} />
    </chakra.div>
  );
}

function Drawing({ spec, layout }: { readonly spec: FigureSpec; readonly layout: FigureLayout }) {
  const edition = useEdition();
  const element = useRef<HTMLDivElement>(null);
  const near = useNearScreen(element);
  const [failed, setFailed] = useState(false);
  const { width, height } = layout;
  const option = useMemo(() => figureOption(spec, width, looks[edition]), [spec, width, edition]);
  useEffect(() => {
    const place = element.current;
    if (!near || place === null) return undefined;
    let erase: (() => void) | null = null;
    let gone = false;
    import('./chart').then(
      ({ drawChart }) => {
        if (!gone) erase = drawChart(place, option, { width, height });
      },
      () => setFailed(true),
    );
    return () => {
      gone = true;
      erase?.();
    };
  }, [near, option, width, height]);
  return (
    <>
      <div ref={element} aria-hidden style={{ width, height }} />
      {failed && <p role="alert">The figure could not be drawn; its data and CSV are there.</p>}
    </>
  );
}

/** A line through all panels at the point chosen, and a ring round it. */
function Cross({ layout, chosen }: { readonly layout: FigureLayout; readonly chosen: readonly PlacedPoint[] }) {
  const [first] = chosen;
  if (first === undefined) return null;
  const [top, bottom] = [layout.panels[0]?.top ?? 0, layout.panels.at(-1)?.bottom ?? 0];
  return (
    <chakra.svg
      position="absolute"
      inset="0"
      width={layout.width}
      height={layout.height}
      aria-hidden
      pointerEvents="none"
    >
      <chakra.line
        stroke="ink"
        strokeDasharray="2 2"
        shapeRendering="crispEdges"
        x1={first.left}
        x2={first.left}
        y1={top}
        y2={bottom}
      />
      {chosen.map((placed) => (
        <chakra.circle
          key={placed.panel}
          fill="none"
          stroke="ink"
          strokeWidth="1.4"
          cx={placed.left}
          cy={placed.top}
          r="7"
        />
      ))}
    </chakra.svg>
  );
}

/** The id of the point that a key leads to; undefined when the key is none of ours. */
function nextPoint(key: string, points: readonly PlacedPoint[], selected: string | null): string | null | undefined {
  const ids = [...new Set(points.map((placed) => placed.point.id))];
  if (key === 'Escape') return null;
  const at = selected === null ? -1 : ids.indexOf(selected);
  const to = { ArrowRight: at + 1, ArrowLeft: at - 1, Home: 0, End: ids.length - 1 }[key];
  return to === undefined ? undefined : ids[Math.min(ids.length - 1, Math.max(0, to))];
}

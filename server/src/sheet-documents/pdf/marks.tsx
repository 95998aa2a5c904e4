import { G, Line, Path, Rect, Svg, Text, View } from '@react-pdf/renderer';
import type { ReactNode } from 'react';
import { printPalette, seriesMark } from './print-palette.js';
import { styles } from './print-layout.js';

const TUBE_BOTTOM = 12.6;
const TUBE_MOUTH = 2.8;

/** How a version stands, drawn as an evaporation tube: how full, how turned, with which line. */
interface Tube {
  /** 0 to 1 */
  readonly level: number;
  /** degrees */
  readonly turn: number;
}
const TUBES: Readonly<Record<string, Tube>> = {
  DRAFT: { level: 0, turn: 0 },
  IN_REVIEW: { level: 0.34, turn: 0 },
  RETURNED: { level: 0, turn: 52 },
  APPROVED: { level: 0.67, turn: 0 },
  RELEASED: { level: 1, turn: 0 },
  SUPERSEDED: { level: 0, turn: 0 },
  WITHDRAWN: { level: 0, turn: 180 },
};
const EMPTY_TUBE: Tube = { level: 0, turn: 0 };

/** The state of a version as a mark; the word stands beside it always. */
export function StateMark({ status, word }: { readonly status: string; readonly word: string }) {
  const { level, turn } = TUBES[status] ?? EMPTY_TUBE;
  const surface = TUBE_BOTTOM - (TUBE_BOTTOM - TUBE_MOUTH) * level;
  const colour = status === 'WITHDRAWN' ? printPalette.warn : printPalette.ink;
  return (
    <View style={{ flexDirection: 'row', alignItems: 'center' }}>
      <Svg width={8.2} height={10} viewBox="0 0 13 16">
        <G transform={`rotate(${turn} 6.5 7.5)`}>
          {level > 0 && (
            <Path
              fill={printPalette.accent}
              d={`M3 ${surface}H10V10.9A2.9 2.9 0 0 1 7.1 13.8H5.9A2.9 2.9 0 0 1 3 10.9Z`}
            />
          )}
          <Path
            fill="none"
            stroke={colour}
            strokeWidth={1.3}
            d="M1.2 1.3H3V10.9A2.9 2.9 0 0 0 5.9 13.8H7.1A2.9 2.9 0 0 0 10 10.9V1.3H11.8"
          />
          {status === 'IN_REVIEW' && <Path fill="none" stroke={colour} strokeWidth={1.2} d={`M0 ${surface}H13`} />}
          {status === 'SUPERSEDED' && (
            <Path fill="none" stroke={colour} strokeWidth={1.3} d="M4.4 4.2H8.6M4.4 6.7H8.6M4.4 9.2H8.6" />
          )}
        </G>
      </Svg>
      <Text style={{ fontWeight: 600, color: colour, marginLeft: 4 }}>{word}</Text>
    </View>
  );
}

/** Colour and shape of a series: filled where it carries weight, open where it was left out. */
export function SeriesMarkKey({ mark, isOpen }: { readonly mark: number; readonly isOpen: boolean }) {
  const { colour, path } = seriesMark(mark);
  const look = isOpen ? { fill: printPalette.paper, stroke: colour, strokeWidth: 0.32 } : { fill: colour };
  return (
    <Svg width={9} height={9} viewBox="-1.8 -1.8 3.6 3.6">
      <Path d={path} {...look} />
    </Svg>
  );
}

interface LineKeyProps {
  readonly colour: string;
  readonly width: number;
  readonly dash?: readonly number[];
  /** An area instead of a line */
  readonly isBand?: boolean;
}

export function LineKey({ colour, width, dash, isBand = false }: LineKeyProps) {
  return (
    <Svg width={16} height={7} viewBox="0 0 21 9">
      {isBand ? (
        <Rect x={0} y={1} width={21} height={7} fill={colour} />
      ) : (
        <Line
          x1={0}
          x2={21}
          y1={4.5}
          y2={4.5}
          stroke={colour}
          strokeWidth={width}
          {...(dash === undefined ? {} : { strokeDasharray: dash.join(' ') })}
        />
      )}
    </Svg>
  );
}

/** A mark and its words. */
export function Key({ mark, children }: { readonly mark: ReactNode; readonly children: ReactNode }) {
  return (
    <View style={styles.key}>
      <View style={styles.keyMark}>{mark}</View>
      <Text style={styles.keyText}>{children}</Text>
    </View>
  );
}

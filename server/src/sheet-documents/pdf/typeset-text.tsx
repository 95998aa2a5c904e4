import { Text } from '@react-pdf/renderer';
import type { Style } from '@react-pdf/types';
import type { TextRun, TextStyle } from '../typeset.types.js';

/** Sub- and superscripts are set smaller; the renderer only moves them. */
const SCRIPT_SIZE = 0.72;

function styleOf(style: TextStyle, fontSize: number): Style | null {
  switch (style) {
    case 'PLAIN':
      return null;
    case 'STRONG':
      return { fontWeight: 600 };
    case 'QUANTITY':
      return { fontStyle: 'italic' };
    case 'SUBSCRIPT':
      return { fontSize: SCRIPT_SIZE * fontSize, verticalAlign: 'sub' };
    case 'SUPERSCRIPT':
      return { fontSize: SCRIPT_SIZE * fontSize, verticalAlign: 'super' };
  }
}

interface RunsProps {
  readonly runs: readonly TextRun[];
  /** Of the text around, pt */
  readonly size: number;
}

/** Runs of text, for use inside a `Text`. */
export function Runs({ runs, size }: RunsProps) {
  return runs.map(({ text, style }, i) => {
    const own = styleOf(style, size);
    return own === null ? (
      text
    ) : (
      <Text key={i} style={own}>
        {text}
      </Text>
    );
  });
}

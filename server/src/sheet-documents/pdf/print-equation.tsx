import { Path, Svg, Text, View } from '@react-pdf/renderer';
import type { SheetCorrelation } from '../sheet-content.types.js';
import type { EquationPiece } from '../typeset.types.js';
import { printPalette } from './print-palette.js';
import { styles } from './print-layout.js';
import { Runs } from './typeset-text.js';

const EQUATION_SIZE = 17;
const EXPONENT_SIZE = 11.5;

/** The equation on the left, the parameters aligned on their equals signs on the right. */
export function PrintCorrelation({ correlation }: { readonly correlation: SheetCorrelation }) {
  return (
    <View style={styles.correlation}>
      <View style={styles.equation}>
        {correlation.equation.map((piece, i) => (
          <Piece key={i} piece={piece} />
        ))}
      </View>
      <View style={styles.parameters}>
        {correlation.parameters.map(({ symbol, label, printed, note, standardUncertainty }) => (
          <View key={symbol} style={styles.parameter}>
            <Text style={styles.parameterLabel}>
              <Runs runs={label} size={9} />
            </Text>
            <Text style={styles.parameterSign}>=</Text>
            <Text style={standardUncertainty === null ? {} : styles.strong}>
              {note === null ? printed : `${printed}, ${note}`}
            </Text>
          </View>
        ))}
        {correlation.coefficients.map(({ label, printed }, i) => (
          <View key={i} style={styles.parameter}>
            <Text style={styles.parameterLabel}>
              <Runs runs={label} size={9} />
            </Text>
            <Text style={styles.parameterSign}>=</Text>
            <Text>{printed}</Text>
          </View>
        ))}
      </View>
    </View>
  );
}

function Piece({ piece }: { readonly piece: EquationPiece }) {
  return (
    <>
      {piece.bracketed && <Bracket isClosing={false} />}
      {piece.numerator !== null && piece.denominator !== null ? (
        <View style={styles.fraction}>
          <Text>
            <Runs runs={piece.numerator} size={EQUATION_SIZE} />
          </Text>
          <View style={styles.fractionBar} />
          <Text>
            <Runs runs={piece.denominator} size={EQUATION_SIZE} />
          </Text>
        </View>
      ) : (
        <Text>
          <Runs runs={piece.runs} size={EQUATION_SIZE} />
        </Text>
      )}
      {piece.bracketed && <Bracket isClosing />}
      {piece.exponent !== null && (
        <Text style={styles.exponent}>
          <Runs runs={piece.exponent} size={EXPONENT_SIZE} />
        </Text>
      )}
    </>
  );
}

/** A round bracket as high as the fraction; a letter of the font would be too small. */
function Bracket({ isClosing }: { readonly isClosing: boolean }) {
  const arc = isClosing ? 'M1 1Q7 22 1 43' : 'M6 1Q0 22 6 43';
  return (
    <Svg width={6} height={40} viewBox="0 0 7 44">
      <Path d={arc} fill="none" stroke={printPalette.ink} strokeWidth={1} />
    </Svg>
  );
}

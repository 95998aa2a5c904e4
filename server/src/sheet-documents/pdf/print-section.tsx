import { Text, View } from '@react-pdf/renderer';
import type { ReactNode } from 'react';
import type { SheetContent } from '../sheet-content.types.js';
import type { TextRun } from '../typeset.types.js';
import { styles } from './print-layout.js';
import { Runs } from './typeset-text.js';

interface RowProps {
  readonly margin?: ReactNode;
  /** Whether the row may be parted between two pages */
  readonly wrap?: boolean;
  readonly children: ReactNode;
}

/** The column, and the margin level with it. */
export function PrintRowWithMargin({ margin, wrap = false, children }: RowProps) {
  return (
    <View style={styles.row} wrap={wrap}>
      <View style={styles.column}>{children}</View>
      {margin === undefined ? <View style={styles.marginEmpty} /> : <View style={styles.margin}>{margin}</View>}
    </View>
  );
}

interface SectionProps extends RowProps {
  readonly content: SheetContent;
  readonly id: string;
}

/** A numbered section with the editor's remark at its end. */
export function PrintSection({ content, id, children, ...row }: SectionProps) {
  const section = content.sections.find((one) => one.id === id);
  const remark = content.remarks.find((one) => one.section === id);
  return (
    <PrintRowWithMargin {...row}>
      <View style={styles.heading} minPresenceAhead={40}>
        <Text style={styles.headingNumber}>{section?.number}</Text>
        <Text style={styles.headingText}>{section?.title}</Text>
      </View>
      {children}
      {remark !== undefined && <Text style={styles.remark}>{remark.text}</Text>}
    </PrintRowWithMargin>
  );
}

/** Paragraphs of the margin or of small print. */
export function Paragraphs({
  paragraphs,
  size,
}: {
  readonly paragraphs: readonly (readonly TextRun[])[];
  readonly size: number;
}) {
  return paragraphs.map((runs, i) => (
    <Text key={i} style={styles.marginParagraph}>
      <Runs runs={runs} size={size} />
    </Text>
  ));
}

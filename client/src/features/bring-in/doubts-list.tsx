import { chakra } from '@chakra-ui/react';
import { useId, type ReactNode } from 'react';
import { counted } from '../../lib/counted';
import { fill } from '../../lib/fill';
import { bringInStrings } from '../../strings/bring-in';
import { TickMark, WarnMark } from '../../ui/marks/marks';
import { type ChoiceId, type Issue, type NumberedIssue, type ReadAnswer } from './answer';

const words = bringInStrings.doubts;
/** So many of one kind can be decided at once. */
const MANY = 4;
/** So many stand in the margin at a time. */
const SHOWN_AT_ONCE = 60;

interface DoubtsListProps {
  readonly answer: ReadAnswer;
  readonly issues: readonly NumberedIssue[];
  readonly decisions: Readonly<Record<string, ChoiceId>>;
  readonly onDecide: (id: string, choice: ChoiceId | null) => void;
}

/** Every doubt and refusal under its number, with its reason and what can be chosen. */
export function DoubtsList({ answer, issues, decisions, onDecide }: DoubtsListProps) {
  const kinds = Object.entries(answer.issueCounts).filter(([, count]) => count >= MANY);
  const shown = issues.slice(0, SHOWN_AT_ONCE);
  const hidden = Object.values(answer.issueCounts).reduce((sum, count) => sum + count, 0) - shown.length;
  return (
    <div>
      <chakra.h3
        fontSize="13px"
        lineHeight="20px"
        fontWeight={600}
        color="ink"
        borderBottom="1px solid"
        borderColor="ink"
        paddingBottom="6px"
      >
        {titleOf(issues)}
      </chakra.h3>
      {issues.length === 0 && (
        <chakra.p marginTop="9px">
          <TickMark />
          {words.none}
        </chakra.p>
      )}
      {kinds.map(([code, count]) => (
        <Kind
          key={code}
          code={code}
          count={count}
          issues={issues}
          decided={decisions[code] ?? null}
          onDecide={onDecide}
        />
      ))}
      <chakra.ol listStyle="none">
        {shown.map((one) => (
          <Doubt key={one.issue.id} one={one} answer={answer} onDecide={onDecide} />
        ))}
      </chakra.ol>
      {hidden > 0 && <chakra.p marginTop="9px">{fill(words.more, { n: hidden })}</chakra.p>}
    </div>
  );
}

function titleOf(issues: readonly NumberedIssue[]): string {
  const refusals = issues.filter(({ issue }) => issue.severity === 'REFUSAL').length;
  const doubts = issues.length - refusals;
  if (refusals === 0) return counted(words.title, doubts);
  return doubts === 0
    ? counted(words.refused, refusals)
    : `${counted(words.refused, refusals)}, ${counted(words.title, doubts).toLowerCase()}`;
}

interface KindProps {
  readonly code: string;
  readonly count: number;
  readonly issues: readonly NumberedIssue[];
  readonly decided: ChoiceId | null;
  readonly onDecide: DoubtsListProps['onDecide'];
}

function Kind({ code, count, issues, decided, onDecide }: KindProps) {
  const example = issues.find(({ issue }) => issue.code === code)?.issue;
  if (example === undefined || example.choices.length === 0) return null;
  const choices = example.choices.map(({ id }) => ({ id, label: words[`all_${id}`] }));
  return (
    <chakra.div padding="9px 0 8px" borderBottom="1px solid" borderColor="rule">
      <Choices
        legend={<b>{fill(words.kindTitle, { n: count, kind: kindName(code) })}</b>}
        choices={choices}
        decided={decided}
        onChoose={(choice) => onDecide(code, choice)}
        clear={words.singly}
      />
    </chakra.div>
  );
}

const kindName = (code: string): string => {
  const names: Readonly<Record<string, string>> = bringInStrings.codes;
  return names[code] ?? code;
};

interface DoubtProps {
  readonly one: NumberedIssue;
  readonly answer: ReadAnswer;
  readonly onDecide: DoubtsListProps['onDecide'];
}

function Doubt({ one: { issue, number }, answer, onDecide }: DoubtProps) {
  const isOpen = issue.decided === null;
  return (
    <chakra.li
      display="grid"
      gridTemplateColumns="22px minmax(0, 1fr)"
      padding="9px 0 8px"
      borderBottom="1px solid"
      borderColor="rule"
      id={`doubt-${number}`}
    >
      <chakra.span color={issue.sameAsRow === null ? 'warn' : 'ink'} fontWeight={600} fontFeatureSettings='"tnum"'>
        {number}
      </chakra.span>
      <div>
        <Choices
          legend={
            <>
              <chakra.b color="ink" fontWeight={600}>{`${placeOf(issue, answer)}.`}</chakra.b> {issue.message}
            </>
          }
          choices={issue.choices.map(({ id, label }) => ({
            id,
            label: id === issue.suggested ? `${label} (${words.suggested})` : label,
          }))}
          decided={issue.decided}
          onChoose={(choice) => onDecide(issue.id, choice)}
        />
        {issue.severity === 'REFUSAL' && isOpen && (
          <chakra.p>{issue.row === null ? words.mendColumn : words.mendCell}</chakra.p>
        )}
        {isOpen && (
          <chakra.p color="warn" marginTop="2px">
            <WarnMark />
            {issue.severity === 'REFUSAL' ? words.toMend : words.notDecided}
          </chakra.p>
        )}
      </div>
    </chakra.li>
  );
}

function placeOf({ row, column, sameAsRow }: Issue, answer: ReadAnswer): string {
  if (sameAsRow !== null) return fill(words.sameRows, { first: sameAsRow, second: row ?? '' });
  const role = column === null ? undefined : answer.mapping.columns[column]?.role;
  if (row === null) {
    const header = column === null ? '' : (answer.columns[column]?.header ?? '');
    return column === null
      ? words.place.table
      : fill(words.place.column, { column: header === '' ? column + 1 : `“${header}”` });
  }
  if (column === null || role === undefined) return fill(words.place.row, { row });
  const text = answer.rows.find(({ number }) => number === row)?.cells[column] ?? '';
  return fill(words.place.cell, { row, role: bringInStrings.roles[role], text }).trim();
}

interface ChoicesProps {
  readonly legend: ReactNode;
  readonly choices: readonly { readonly id: ChoiceId; readonly label: string }[];
  readonly decided: ChoiceId | null;
  readonly onChoose: (choice: ChoiceId | null) => void;
  /** Takes a choice back, where that can be wanted. */
  readonly clear?: string;
}

/** One of several, or one to be ticked and unticked. */
function Choices({ legend, choices, decided, onChoose, clear }: ChoicesProps) {
  const name = useId();
  const [only] = choices;
  return (
    <chakra.fieldset minWidth="0" color="ink2">
      <chakra.legend float="left" width="100%">
        {legend}
      </chakra.legend>
      <chakra.div display="flex" flexWrap="wrap" gap="0 14px" clear="both">
        {choices.length === 1 && only ? (
          <label style={LABEL}>
            <chakra.input
              type="checkbox"
              accentColor="accent"
              checked={decided === only.id}
              onChange={() => onChoose(decided === only.id ? null : only.id)}
            />
            {only.label}
          </label>
        ) : (
          [...choices, ...(clear === undefined ? [] : [{ id: null, label: clear }])].map(({ id, label }) => (
            <label key={id} style={LABEL}>
              <chakra.input
                type="radio"
                accentColor="accent"
                name={name}
                checked={decided === id}
                onChange={() => onChoose(id)}
              />
              {label}
            </label>
          ))
        )}
      </chakra.div>
    </chakra.fieldset>
  );
}

const LABEL = {
  display: 'inline-flex',
  gap: '6px',
  alignItems: 'baseline',
  minHeight: '26px',
  cursor: 'pointer',
} as const;

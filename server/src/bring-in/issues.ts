/** What is wrong or doubtful about a table, each thing at its cell, row or column. */
export type RefusalCode =
  | 'MISSING_COLUMN'
  | 'COLUMN_TWICE'
  | 'UNKNOWN_UNIT'
  | 'WRONG_UNIT'
  | 'UNIT_MISSING'
  | 'BAD_CONSTANT'
  | 'BAD_COVERAGE_FACTOR'
  | 'COMMON_VARIES'
  | 'NO_ROWS'
  | 'TEXT_IN_NUMBER'
  | 'DATE_IN_NUMBER'
  | 'CELL_ERROR'
  | 'FORMULA_WITHOUT_RESULT'
  | 'MISSING_VALUE'
  | 'NOT_POSITIVE'
  | 'OUT_OF_BOUNDS';

export type DoubtCode =
  | 'UNIT_GUESSED'
  | 'UNIT_OFF'
  | 'FORMULA'
  | 'DECIMAL_OR_THOUSANDS'
  | 'UNIT_OF_CELL'
  | 'DECIMAL_SHIFT'
  | 'FALLS_WITH_TEMPERATURE'
  | 'FAR_FROM_ESTIMATE'
  | 'DUPLICATE_ROW';

export type IssueCode = RefusalCode | DoubtCode;

/** KEEP it as it stands; LEAVE_OUT the row; READ_AS the other value or unit. */
export type ChoiceId = 'KEEP' | 'LEAVE_OUT' | 'READ_AS';

export interface Choice {
  id: ChoiceId;
  label: string;
}

export interface Issue {
  /** the same for the same thing in the same table under the same mapping */
  id: string;
  code: IssueCode;
  /** a refusal has to be mended or its row left out; a doubt has to be decided */
  severity: 'REFUSAL' | 'DOUBT';
  /** as a spreadsheet counts; null for what concerns a column or the whole table */
  row: number | null;
  /** from 0; null for what concerns a row or the whole table */
  column: number | null;
  message: string;
  choices: Choice[];
  suggested: ChoiceId | null;
  decided: ChoiceId | null;
  /** what READ_AS makes of it: a value in SI for a cell, a unit for a column */
  readAs: { value: number } | { unit: string } | null;
  /** of a duplicate: the row that came first */
  sameAsRow: number | null;
}

const LEAVE_OUT: Choice = { id: 'LEAVE_OUT', label: 'leave the row out' };

type Place = { row: number | null; column: number | null };
type Extra = Partial<Pick<Issue, 'choices' | 'suggested' | 'readAs' | 'sameAsRow'>>;

const issue = (severity: Issue['severity'], code: IssueCode, at: Place, message: string, extra: Extra): Issue => ({
  id: [code, at.row ?? '', at.column ?? ''].join(':'),
  code,
  severity,
  ...at,
  message,
  choices: [],
  suggested: null,
  decided: null,
  readAs: null,
  sameAsRow: null,
  ...extra,
});

/** A refusal in a row can be settled by leaving that row out, one of a column or table only by mending it. */
export const refusal = (code: RefusalCode, at: Place, message: string): Issue =>
  issue('REFUSAL', code, at, message, { choices: at.row === null ? [] : [LEAVE_OUT] });

/** A doubt about a row or cell; leaving the row out is always one of the choices. */
export const doubt = (code: DoubtCode, at: Place, message: string, extra: Extra & { choices: Choice[] }): Issue =>
  issue('DOUBT', code, at, message, {
    ...extra,
    choices: at.row === null ? extra.choices : [...extra.choices, LEAVE_OUT],
  });

/** Choices by the id of an issue, or by its code for all of that kind. */
export type Decisions = Readonly<Record<string, ChoiceId>>;

/** Marks what is decided; a choice that an issue does not offer decides nothing. */
export function decide(issues: readonly Issue[], decisions: Decisions): Issue[] {
  return issues.map((one) => {
    const chosen = decisions[one.id] ?? decisions[one.code];
    return one.choices.some(({ id }) => id === chosen) ? { ...one, decided: chosen ?? null } : one;
  });
}

export const isOpen = (one: Issue): boolean => one.decided === null;

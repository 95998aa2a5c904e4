import { chakra, useSlotRecipe } from '@chakra-ui/react';
import { HttpProblem } from '../../lib/http';
import { fill } from '../../lib/fill';
import { bringInStrings } from '../../strings/bring-in';
import { Empty, Failed, Loading, Progress } from '../../ui/feedback/states';
import { WordButton } from '../../ui/form/button';
import { Section } from '../../ui/page/section';
import { pastedGridRecipe } from '../../ui/recipes/table.recipe';
import { asDecided, numbered, type ReadAnswer } from './answer';
import { Constants } from './constants';
import { DeviationFigure } from './deviation-figure';
import { DoubtsList } from './doubts-list';
import { type Draft, withMapping } from './draft';
import { type Reading } from './use-reading';
import { UnderstoodTable } from './understood-table';

const words = bringInStrings.understood;

interface UnderstoodSectionProps {
  readonly draft: Draft;
  readonly onDraft: (draft: Draft) => void;
  readonly reading: Reading;
}

/** What the service understood of the table, its doubts in the margin. */
export function UnderstoodSection({ draft, onDraft, reading }: UnderstoodSectionProps) {
  const { answer, error, isReading } = reading;
  const issues = answer === null ? [] : numbered(answer.issues.map((issue) => asDecided(issue, draft.decisions)));
  return (
    <Section
      number={3}
      title={words.title}
      id="understood"
      margin={
        answer !== null && (
          <DoubtsList
            answer={answer}
            issues={issues}
            decisions={draft.decisions}
            onDecide={(id, choice) => {
              const { [id]: _before, ...others } = draft.decisions;
              onDraft({ ...draft, decisions: choice === null ? others : { ...others, [id]: choice } });
            }}
          />
        )
      }
    >
      {answer === null && error === null && !isReading && <Empty sentence={words.none} />}
      {isReading && (
        <Loading what={words.reading}>
          <Progress label={words.reading} share={null}>
            <WordButton onClick={reading.cancel}>{bringInStrings.table.cancel}</WordButton>
          </Progress>
        </Loading>
      )}
      {error !== null && (
        <Failed
          what={words.failed}
          why={`${error instanceof HttpProblem ? error.message : ''} ${words.kept}`}
          onRetry={reading.again}
        />
      )}
      {answer !== null && (
        <Understood answer={answer} issues={issues} draft={draft} onDraft={onDraft} isStale={reading.isStale} />
      )}
    </Section>
  );
}

interface UnderstoodProps {
  readonly answer: ReadAnswer;
  readonly issues: ReturnType<typeof numbered>;
  readonly draft: Draft;
  readonly onDraft: (draft: Draft) => void;
  readonly isStale: boolean;
}

function Understood({ answer, issues, draft, onDraft, isStale }: UnderstoodProps) {
  const { mapping, rows, source } = answer;
  return (
    <div aria-busy={isStale}>
      <chakra.p textStyle="small" color="ink2">
        {words.note}
      </chakra.p>
      <UnderstoodTable
        answer={answer}
        issues={issues}
        onColumn={(index, column) =>
          onDraft(
            withMapping(
              draft,
              { ...mapping, columns: mapping.columns.map((one, i) => (i === index ? column : one)) },
              index,
            ),
          )
        }
      />
      <Legend />
      {rows.length < source.rowCount && (
        <chakra.p textStyle="caption" color="ink2">
          {fill(words.firstRows, { shown: rows.length, total: source.rowCount })}
        </chakra.p>
      )}
      <Constants mapping={mapping} onMapping={(next) => onDraft(withMapping(draft, next, null))} />
      <DeviationFigure answer={answer} />
    </div>
  );
}

function Legend() {
  const styles = useSlotRecipe({ recipe: pastedGridRecipe })();
  return (
    <chakra.p css={styles.legend}>
      <span>
        <chakra.span css={styles.swatch} aria-hidden />
        {words.doubtfulCell}
      </span>
      <span>
        <chakra.span
          display="inline-block"
          width="6px"
          height="14px"
          verticalAlign="-2px"
          marginRight="7px"
          border="1.4px solid"
          borderColor="ink"
          borderRight="0"
          aria-hidden
        />
        {words.sameTwice}
      </span>
      <span>{words.leftOutRow}</span>
      <span>
        <chakra.b color="warn" fontWeight={600} marginRight="7px">
          ?
        </chakra.b>
        {words.undecided}
      </span>
    </chakra.p>
  );
}

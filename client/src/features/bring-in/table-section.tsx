import { chakra, useSlotRecipe } from '@chakra-ui/react';
import { useId } from 'react';
import { bringInStrings } from '../../strings/bring-in';
import { Views } from '../../ui/form/views';
import { Section } from '../../ui/page/section';
import { fieldRecipe } from '../../ui/recipes/control.recipe';
import { type Draft, WAYS, withTable } from './draft';
import { LONGEST_TEXT } from './requests';
import { TypedGrid } from './typed-grid';
import { UploadField } from './upload-field';
import { type Upload } from './use-upload';

const words = bringInStrings.table;
const panel = 'bring-in-table';

interface TableSectionProps {
  readonly draft: Draft;
  readonly onDraft: (draft: Draft) => void;
  readonly upload: Upload;
}

/** The table, in one of three ways. What was brought in one way stays while another is looked at. */
export function TableSection({ draft, onDraft, upload }: TableSectionProps) {
  const paste = (text: string) => {
    if (text.length <= LONGEST_TEXT) return onDraft(withTable(draft, { text }));
    onDraft(withTable(draft, { way: 'UPLOAD' }));
    upload.send(new File([text], words.pastedFile, { type: 'text/plain' }));
  };
  return (
    <Section number={2} title={words.title} id="table">
      <Views
        label={words.ways}
        options={WAYS.map((way) => ({ value: way, label: words[way] }))}
        value={draft.way}
        onChange={(way) => onDraft(withTable(draft, { way }))}
        controls={panel}
      />
      <chakra.div id={panel} role="tabpanel" aria-label={words[draft.way]} marginTop="16px">
        {draft.way === 'PASTE' && <PasteField text={draft.text} onText={paste} />}
        {draft.way === 'UPLOAD' && <UploadField file={draft.file} upload={upload} />}
        {draft.way === 'TYPE' && (
          <>
            <chakra.p textStyle="caption" color="ink2">
              {words.typeHint}
            </chakra.p>
            <TypedGrid
              grid={draft.grid}
              onChange={({ units, rows }) =>
                onDraft(withTable(draft, { grid: { units: [...units], rows: rows.map((row) => [...row]) } }))
              }
            />
          </>
        )}
      </chakra.div>
    </Section>
  );
}

function PasteField({ text, onText }: { readonly text: string; readonly onText: (text: string) => void }) {
  const styles = useSlotRecipe({ recipe: fieldRecipe })();
  const id = useId();
  return (
    <chakra.div css={styles.root}>
      <chakra.label css={styles.label} htmlFor={id}>
        {words.paste}
      </chakra.label>
      <chakra.textarea
        css={styles.area}
        id={id}
        rows={8}
        value={text}
        onChange={(event) => onText(event.target.value)}
        aria-describedby={`${id}-hint`}
        spellCheck={false}
        wrap="off"
        fontFamily="mono"
        textStyle="code"
        tabSize={10}
      />
      <chakra.p css={styles.hint} id={`${id}-hint`}>
        {words.pasteHint}
      </chakra.p>
    </chakra.div>
  );
}

import { chakra, useSlotRecipe } from '@chakra-ui/react';
import { useId } from 'react';
import { fill } from '../../lib/fill';
import { formatBytes } from '../../lib/format-quantity';
import { bringInStrings } from '../../strings/bring-in';
import { Failed, Progress } from '../../ui/feedback/states';
import { WordButton } from '../../ui/form/button';
import { TickMark } from '../../ui/marks/marks';
import { fieldRecipe } from '../../ui/recipes/control.recipe';
import { type UploadedFile } from './draft';
import { type Upload } from './use-upload';

const words = bringInStrings.table;

/** Chooses a file and shows how far it has gone up. */
export function UploadField({ file, upload }: { readonly file: UploadedFile | null; readonly upload: Upload }) {
  const styles = useSlotRecipe({ recipe: fieldRecipe })();
  const id = useId();
  return (
    <chakra.div css={styles.root} maxWidth="640px">
      <chakra.label css={styles.label} htmlFor={id}>
        {words.file}
      </chakra.label>
      <chakra.input
        id={id}
        type="file"
        accept=".csv,.txt,.tsv,.xlsx,text/csv,text/plain"
        aria-describedby={`${id}-hint`}
        css={FILE}
        onChange={(event) => {
          const chosen = event.target.files?.[0];
          if (chosen) upload.send(chosen);
          // The same file, mended, can be chosen again.
          event.target.value = '';
        }}
      />
      <chakra.p css={styles.hint} id={`${id}-hint`}>
        {words.fileHint}
      </chakra.p>
      {upload.share !== null && (
        <chakra.div marginTop="12px" textStyle="small" maxWidth="420px">
          <p>{fill(words.uploading, { name: upload.name })}</p>
          <Progress label={fill(words.uploading, { name: upload.name })} share={upload.share}>
            <chakra.p color="ink2">
              {fill(words.sent, { share: Math.round(100 * upload.share), size: formatBytes(upload.size) })}{' '}
              <WordButton onClick={upload.cancel}>{words.cancel}</WordButton>
            </chakra.p>
          </Progress>
        </chakra.div>
      )}
      {upload.share === null && upload.failure !== null && <Failed what={words.uploadFailed} why={upload.failure} />}
      {upload.share === null && file !== null && (
        <chakra.p textStyle="small" marginTop="12px" role="status">
          <TickMark />
          {fill(words.uploaded, { name: file.name, size: formatBytes(file.size) })}{' '}
          <chakra.span color="ink2">{words.another}</chakra.span>
        </chakra.p>
      )}
    </chakra.div>
  );
}

const FILE = {
  display: 'block',
  width: '100%',
  padding: '10px 0',
  fontSize: '15px',
  lineHeight: '24px',
  borderBottom: '1.5px solid',
  borderColor: 'control',
  '&::file-selector-button': {
    font: 'inherit',
    fontWeight: 550,
    color: 'ink',
    background: 'none',
    border: '1px solid',
    borderColor: 'control',
    borderRadius: 'control',
    padding: '4px 14px',
    marginRight: '14px',
    cursor: 'pointer',
  },
} as const;

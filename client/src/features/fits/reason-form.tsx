import { zodResolver } from '@hookform/resolvers/zod';
import { chakra } from '@chakra-ui/react';
import { useEffect } from 'react';
import { useForm } from 'react-hook-form';
import { z } from 'zod';
import { fitStrings } from '../../strings/fits';
import { Button, WordButton } from '../../ui/form/button';
import { SelectField, TextField } from '../../ui/form/field';
import { parseReason, reasonCodes, reasonText } from './reasons';

const words = fitStrings.reason;

export const reasonSchema = z.object({
  code: z.enum(reasonCodes, words.needsCode),
  words: z.string().trim().min(1, words.needsWords),
});

interface ReasonFormProps {
  readonly title: string;
  /** The reason given so far, or null. */
  readonly given: string | null;
  readonly onGive: (reason: string) => void;
  readonly onCancel: () => void;
}

const choices = [
  { value: '', label: words.choose },
  ...reasonCodes.map((code) => ({ value: code, label: words.codes[code] })),
];

/** Asks why something is left out: one of a short list, and words. */
export function ReasonForm({ title, given, onGive, onCancel }: ReasonFormProps) {
  const before = given === null ? null : parseReason(given);
  const { control, handleSubmit, setFocus } = useForm({
    resolver: zodResolver(reasonSchema),
    defaultValues: { code: before?.code ?? ('' as 'other'), words: before?.words ?? '' },
  });
  useEffect(() => setFocus('code'), [setFocus]);
  return (
    <chakra.form
      noValidate
      aria-label={title}
      onSubmit={(event) => void handleSubmit((reason) => onGive(reasonText(reason.code, reason.words)))(event)}
      onKeyDown={(event) => {
        event.stopPropagation();
        if (event.key === 'Escape') onCancel();
      }}
      borderBlock="1px solid"
      borderColor="accent"
      padding="10px 0 14px"
      margin="8px 0 12px"
    >
      <chakra.p textStyle="small" fontWeight={600} color="ink">
        {title}
      </chakra.p>
      <chakra.div
        display="grid"
        gridTemplateColumns={{ base: '1fr', md: '150px minmax(0, 1fr) auto' }}
        gap="10px 20px"
        alignItems="start"
        marginTop="6px"
      >
        <SelectField control={control} name="code" label={words.code} choices={choices} size="small" />
        <TextField control={control} name="words" label={words.words} size="small" />
        <chakra.span display="inline-flex" gap="16px" alignItems="baseline" paddingTop={{ md: '14px' }}>
          <Button type="submit" size="small">
            {words.leaveOut}
          </Button>
          <WordButton onClick={onCancel}>{words.cancel}</WordButton>
        </chakra.span>
      </chakra.div>
    </chakra.form>
  );
}

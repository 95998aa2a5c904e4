import { useMutation, useQuery } from '@apollo/client/react';
import { chakra, useSlotRecipe } from '@chakra-ui/react';
import { zodResolver } from '@hookform/resolvers/zod';
import { useState } from 'react';
import { useForm } from 'react-hook-form';
import { Link } from 'react-router-dom';
import { z } from 'zod';
import { ApiKeysDocument, type ApiKeysQuery, CreateApiKeyDocument, RevokeApiKeyDocument } from '../../gql/graphql';
import { errorMessage } from '../../lib/apollo';
import { fill } from '../../lib/fill';
import { applyProblems } from '../../lib/form-problems';
import { formatShortDate } from '../../lib/format-quantity';
import { paths } from '../../lib/paths';
import { usePerson } from '../../lib/session';
import { apiGuideStrings } from '../../strings/api-guide';
import { Empty, Failed, Loading } from '../../ui/feedback/states';
import { Button, WordButton } from '../../ui/form/button';
import { FormError, SelectField, TextField } from '../../ui/form/field';
import { MarginBlock } from '../../ui/page/margin-block';
import { Section } from '../../ui/page/section';
import { shownOnceRecipe } from '../../ui/recipes/content.recipe';
import { DataTable, type DataColumn } from '../../ui/table/data-table';

const words = apiGuideStrings.keys;
type Key = ApiKeysQuery['apiKeys'][number];

/** The reader's own keys: made, shown once, listed with their last use, ended. */
export function KeysSection({ number }: { readonly number: number }) {
  const person = usePerson();
  return (
    <Section
      number={number}
      title={words.title}
      id="keys"
      margin={
        <MarginBlock title={words.password}>
          <p>{words.passwordWords}</p>
        </MarginBlock>
      }
    >
      {person === null ? (
        <p>
          <Link to={paths.signIn(paths.apiGuide())}>{words.signIn}</Link>. {words.signInWords}
        </p>
      ) : (
        <Keys />
      )}
    </Section>
  );
}

function Keys() {
  const [secret, setSecret] = useState<string | null>(null);
  const { data, error, refetch } = useQuery(ApiKeysDocument);
  return (
    <>
      {secret !== null && <ShownOnce secret={secret} onHide={() => setSecret(null)} />}
      {error && <Failed what={words.failed} why={errorMessage(error)} onRetry={() => void refetch()} />}
      {!data && !error && <Loading what={words.what} />}
      {data && (data.apiKeys.length === 0 ? <Empty sentence={words.none} /> : <KeyTable keys={data.apiKeys} />)}
      <NewKeyForm onMade={setSecret} />
    </>
  );
}

function ShownOnce({ secret, onHide }: { readonly secret: string; readonly onHide: () => void }) {
  const styles = useSlotRecipe({ recipe: shownOnceRecipe })();
  const [copied, setCopied] = useState(false);
  const copy = async () => {
    await navigator.clipboard.writeText(secret);
    setCopied(true);
  };
  return (
    <chakra.div css={styles.root} role="status">
      <p>
        <b>{words.shownOnce}</b> {words.shownOnceWords}
      </p>
      <chakra.div css={styles.row}>
        <chakra.code css={styles.key}>{secret}</chakra.code>
        <Button size="small" onClick={() => void copy()}>
          {copied ? words.copied : words.copy}
        </Button>
        <Button size="small" onClick={onHide}>
          {words.hide}
        </Button>
      </chakra.div>
    </chakra.div>
  );
}

const KeyTable = ({ keys }: { readonly keys: readonly Key[] }) => (
  <DataTable
    label={words.title}
    columns={columns}
    rows={keys}
    rowId={(key) => key.id}
    file="diffolio-keys"
    filterable={false}
  />
);

const date = (iso: string | null | undefined, otherwise: string): string => (iso ? formatShortDate(iso) : otherwise);

const columns: DataColumn<Key>[] = [
  { id: 'name', head: words.columns.name, name: words.columns.name, value: (key) => key.name },
  {
    id: 'begins',
    head: words.columns.begins,
    name: words.columns.begins,
    sortable: false,
    value: (key) => key.prefix,
    cell: (key) => <code>{key.prefix}</code>,
  },
  {
    id: 'may',
    head: words.columns.may,
    name: words.columns.may,
    sortable: false,
    wideOnly: true,
    value: () => words.may,
  },
  {
    id: 'made',
    head: words.columns.made,
    name: words.columns.made,
    numeric: true,
    wideOnly: true,
    value: (key) => key.createdAt,
    cell: (key) => formatShortDate(key.createdAt),
  },
  {
    id: 'used',
    head: words.columns.used,
    name: words.columns.used,
    numeric: true,
    value: (key) => key.lastUsedAt ?? '',
    cell: (key) => date(key.lastUsedAt, words.never),
  },
  {
    id: 'ends',
    head: words.columns.ends,
    name: words.columns.ends,
    numeric: true,
    wideOnly: true,
    value: (key) => key.revokedAt ?? key.expiresAt ?? '',
    cell: (key) =>
      key.revokedAt ? fill(words.ended, { date: formatShortDate(key.revokedAt) }) : date(key.expiresAt, words.never),
  },
  {
    id: 'act',
    head: words.columns.act,
    name: 'end',
    numeric: true,
    sortable: false,
    value: () => null,
    cell: (key) => (key.revokedAt ? '' : <EndKey apiKey={key} />),
  },
];

function EndKey({ apiKey }: { readonly apiKey: Key }) {
  const [revoke, { loading }] = useMutation(RevokeApiKeyDocument, { errorPolicy: 'all' });
  return (
    <WordButton
      aria-label={fill(words.endNamed, { name: apiKey.name })}
      aria-busy={loading}
      onClick={() => void revoke({ variables: { id: apiKey.id } })}
    >
      {words.end}
    </WordButton>
  );
}

const schema = z.object({ name: z.string().trim().min(1, words.nameMissing), days: z.enum(['30', '365', '0']) });
const LIFETIMES = (['365', '30', '0'] as const).map((value) => ({ value, label: words.lifetimes[value] }));

function NewKeyForm({ onMade }: { readonly onMade: (secret: string) => void }) {
  const form = useForm<z.infer<typeof schema>>({
    resolver: zodResolver(schema),
    defaultValues: { name: '', days: '365' },
  });
  const [create] = useMutation(CreateApiKeyDocument, { errorPolicy: 'all', refetchQueries: ['ApiKeys'] });
  const submit = form.handleSubmit(async ({ name, days }) => {
    const { data, error } = await create({ variables: { name, expiresInDays: days === '0' ? null : Number(days) } });
    const made = data?.createApiKey;
    if (made?.secret) {
      onMade(made.secret);
      form.reset();
      return;
    }
    applyProblems(form.setError, made?.problems ?? [{ message: errorMessage(error) }], (path) =>
      path === 'name' ? 'name' : null,
    );
  });
  return (
    <form onSubmit={submit} noValidate aria-label={words.make}>
      <chakra.div display="flex" flexWrap="wrap" gap="16px 30px" alignItems="flex-end" marginTop="18px">
        <TextField
          control={form.control}
          name="name"
          label={words.name}
          placeholder={words.namePlaceholder}
          size="small"
          width="220px"
        />
        <SelectField control={form.control} name="days" label={words.ends} choices={LIFETIMES} width="150px" />
        <Button type="submit" kind="primary" busy={form.formState.isSubmitting}>
          {words.make}
        </Button>
      </chakra.div>
      <FormError message={form.formState.errors.root?.message} />
    </form>
  );
}

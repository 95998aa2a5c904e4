import { useMutation, useQuery } from '@apollo/client/react';
import { useNavigate } from 'react-router-dom';
import {
  CreateSubstanceDocument,
  SubstanceDetailDocument,
  type SubstanceFieldsFragment,
  type SubstanceInput,
  UpdateSubstanceDocument,
} from '../../gql/graphql';
import { errorCode, errorMessage } from '../../lib/apollo';
import { fill } from '../../lib/fill';
import { type Refusal } from '../../lib/form-problems';
import { paths } from '../../lib/paths';
import { substanceStrings } from '../../strings/substances';
import { Empty, Failed, Loading } from '../../ui/feedback/states';
import { Page } from '../../ui/page/page';
import { Opening } from '../../ui/page/section';
import { SubstanceForm } from './substance-form';

const words = substanceStrings.form;
const library = { name: substanceStrings.title, to: paths.substances() };

/** A new substance of the library. */
export function NewSubstancePage() {
  const navigate = useNavigate();
  const [create] = useMutation(CreateSubstanceDocument, { errorPolicy: 'all', refetchQueries: ['SubstanceList'] });
  const save = async (input: SubstanceInput): Promise<readonly Refusal[]> => {
    const { data, error } = await create({ variables: { input } });
    if (data?.createSubstance.substance) await navigate(paths.substance(data.createSubstance.substance.id));
    return data?.createSubstance.problems ?? refusalOf(error);
  };
  return (
    <Page title={words.newTitle} path={[library, { name: words.newTitle }]}>
      <Opening small title={words.newTitle} lead={substanceStrings.addLead} />
      <SubstanceForm onSave={save} cancelTo={paths.substances()} />
    </Page>
  );
}

export function EditSubstancePage({ id }: { readonly id: string }) {
  const { data, error, refetch } = useQuery(SubstanceDetailDocument, {
    variables: { id },
    fetchPolicy: 'cache-and-network',
  });
  const substance = data?.substance;
  if (substance) return <EditSubstance substance={substance} />;
  return (
    <Page title={substanceStrings.title} path={[library, { name: '…' }]}>
      <Opening small title={substanceStrings.title}>
        {error ? (
          <Failed what={substanceStrings.failed} why={errorMessage(error)} onRetry={() => void refetch()} />
        ) : data ? (
          <Empty sentence={substanceStrings.missing} />
        ) : (
          <Loading what={substanceStrings.what} />
        )}
      </Opening>
    </Page>
  );
}

function EditSubstance({ substance }: { readonly substance: SubstanceFieldsFragment }) {
  const navigate = useNavigate();
  const [update] = useMutation(UpdateSubstanceDocument, { errorPolicy: 'all' });
  const title = fill(words.editTitle, { name: substance.name });
  const save = async (input: SubstanceInput): Promise<readonly Refusal[]> => {
    const { data, error } = await update({
      variables: { input: { ...input, id: substance.id, lockVersion: substance.lockVersion } },
    });
    if (data?.updateSubstance.substance) await navigate(paths.substance(substance.id));
    return data?.updateSubstance.problems ?? refusalOf(error);
  };
  return (
    <Page
      title={title}
      path={[
        library,
        { name: substance.name, to: paths.substance(substance.id) },
        { name: words.editTitle.split(' ')[0] ?? '' },
      ]}
    >
      <Opening small title={title} />
      <SubstanceForm substance={substance} onSave={save} cancelTo={paths.substance(substance.id)} />
    </Page>
  );
}

const refusalOf = (error: unknown): readonly Refusal[] => [
  { message: errorCode(error) === 'CONFLICT' ? words.conflict : errorMessage(error) },
];

import { useMutation } from '@apollo/client/react';
import { chakra } from '@chakra-ui/react';
import { useState } from 'react';
import {
  type AccountRowFragment,
  InvitePersonDocument,
  UpdatePersonDocument,
  type UpdatePersonInput,
} from '../../gql/graphql';
import { errorMessage } from '../../lib/apollo';
import { fill } from '../../lib/fill';
import { adminStrings } from '../../strings/admin';
import { Actions, Button, WordButton } from '../../ui/form/button';
import { FormError } from '../../ui/form/field';
import { TickMark } from '../../ui/marks/marks';
import { Section } from '../../ui/page/section';
import { RoleChoice } from './role-choice';

const words = adminStrings.change;

interface ChangePersonProps {
  readonly person: AccountRowFragment;
  readonly onClose: () => void;
}

/** Roles, disabling, a new invitation. */
export function ChangePerson({ person, onClose }: ChangePersonProps) {
  const [roles, setRoles] = useState([...person.roles]);
  const [failure, setFailure] = useState<string>();
  const [update, updating] = useMutation(UpdatePersonDocument);
  const [invite, inviting] = useMutation(InvitePersonDocument);
  const attempt = async (work: () => Promise<readonly { readonly message: string }[] | undefined>) => {
    setFailure(undefined);
    try {
      const problems = (await work()) ?? [];
      if (problems.length > 0) setFailure(`${words.failed} ${problems.map(({ message }) => message).join(' ')}`);
    } catch (error) {
      setFailure(`${words.failed} ${errorMessage(error)}`);
    }
  };
  const change = (input: Omit<UpdatePersonInput, 'id'>) =>
    attempt(
      async () => (await update({ variables: { input: { id: person.id, ...input } } })).data?.updatePerson.problems,
    );
  const again = () =>
    attempt(
      async () =>
        (await invite({ variables: { input: { email: person.email ?? '', roles } } })).data?.invitePerson.problems,
    );
  const isDisabled = person.accountStatus === 'DISABLED';
  const isDone =
    failure === undefined && ((updating.called && !updating.loading) || (inviting.called && !inviting.loading));
  return (
    <Section title={fill(words.title, { name: person.name || (person.email ?? '') })} id="change">
      <chakra.div marginTop="14px" maxWidth="420px">
        <RoleChoice legend={adminStrings.people.rolesHead} roles={roles} onChange={setRoles} />
      </chakra.div>
      <Actions>
        <Button busy={updating.loading} onClick={() => void change({ roles })}>
          {words.action}
        </Button>
        {person.accountStatus === 'INVITED' && (
          <Button busy={inviting.loading} onClick={() => void again()}>
            {words.again}
          </Button>
        )}
        <Button busy={updating.loading} onClick={() => void change({ disabled: !isDisabled })}>
          {isDisabled ? words.enable : words.disable}
        </Button>
        <WordButton quiet onClick={onClose}>
          {words.close}
        </WordButton>
      </Actions>
      <chakra.p textStyle="caption" color="ink2" marginTop="8px">
        {words.disableNote}
      </chakra.p>
      <FormError message={failure} />
      <p role="status">
        {isDone && (
          <>
            <TickMark />
            {words.done}
          </>
        )}
      </p>
    </Section>
  );
}

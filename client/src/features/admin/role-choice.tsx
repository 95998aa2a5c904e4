import { chakra } from '@chakra-ui/react';
import { type Role } from '../../lib/session';
import { adminStrings } from '../../strings/admin';

export const ROLES: readonly Role[] = ['MODELLER', 'RESEARCHER', 'EDITOR', 'ADMINISTRATOR'];

interface RoleChoiceProps {
  readonly legend: string;
  readonly roles: readonly Role[];
  readonly onChange: (roles: Role[]) => void;
}

/** Any number of roles, each with what it is for. */
export const RoleChoice = ({ legend, roles, onChange }: RoleChoiceProps) => (
  <chakra.fieldset minWidth="0">
    <chakra.legend fontSize="13px" lineHeight="18px" color="ink2">
      {legend}
    </chakra.legend>
    {ROLES.map((role) => (
      <chakra.label
        key={role}
        display="grid"
        gridTemplateColumns="20px minmax(0, 1fr)"
        textStyle="small"
        paddingBlock="3px"
        cursor="pointer"
        alignItems="baseline"
      >
        <chakra.input
          type="checkbox"
          accentColor="accent"
          checked={roles.includes(role)}
          onChange={(event) =>
            onChange(ROLES.filter((one) => (one === role ? event.target.checked : roles.includes(one))))
          }
        />
        <span>
          {adminStrings.roles[role]}
          <chakra.span color="ink2">{`, ${adminStrings.roleNotes[role]}`}</chakra.span>
        </span>
      </chakra.label>
    ))}
  </chakra.fieldset>
);

import { chakra } from '@chakra-ui/react';
import { Fragment } from 'react';
import { Link, useNavigate } from 'react-router-dom';
import { paths } from '../../lib/paths';
import { catalogueStrings } from '../../strings/catalogue';
import { Button } from '../../ui/form/button';

const words = catalogueStrings;

/** One line to find a sheet by; what is looked for stands in the address. */
export function SearchForm({ search }: { readonly search: string }) {
  const navigate = useNavigate();
  const find = (form: FormData) => {
    const text = form.get('search');
    void navigate(paths.catalogue(typeof text === 'string' ? text.trim() : ''));
  };
  return (
    <chakra.search display="block" marginTop="30px">
      <chakra.form
        action={find}
        display="flex"
        gap={{ base: '12px', md: '18px' }}
        alignItems="flex-end"
        maxWidth="760px"
      >
        <chakra.input
          type="search"
          name="search"
          aria-label={words.findLabel}
          placeholder={words.findPlaceholder}
          defaultValue={search}
          autoComplete="off"
          flex={1}
          minWidth={0}
          background="none"
          fontSize={{ base: '17px', md: '21px' }}
          lineHeight="34px"
          padding="2px 0 4px"
          borderBottom="1.5px solid"
          borderColor="control"
          _focusVisible={{ outline: 'none', borderColor: 'accent', boxShadow: '0 1px 0 var(--dfl-colors-accent)' }}
        />
        <Button type="submit" kind="primary">
          {words.find}
        </Button>
      </chakra.form>
      <chakra.p textStyle="caption" color="ink2" marginTop="8px">
        {words.instance}{' '}
        {words.instances.map((instance, i) => (
          <Fragment key={instance}>
            {i > 0 && ', '}
            <Link to={paths.catalogue(instance)}>{instance}</Link>
          </Fragment>
        ))}
        {words.orState}
        <Link to={paths.catalogue(words.instanceState)}>{words.instanceState}</Link>
      </chakra.p>
    </chakra.search>
  );
}

import { isRouteErrorResponse, Link, useRouteError } from 'react-router-dom';
import { paths } from '../lib/paths';
import { appStrings } from '../strings/app';
import { WordButton } from '../ui/form/button';
import { Page } from '../ui/page/page';
import { Opening } from '../ui/page/section';
import { RoleMissing } from './require-person';

const words = appStrings.errors;

/** What stands in place of a page that is missing, closed to the reader, or has failed. */
export function RouteError() {
  const error = useRouteError();
  if (error instanceof RoleMissing) return <NotFound lead={words.forbidden} />;
  if (isRouteErrorResponse(error) && error.status === 404) return <NotFound />;
  return (
    <Page title={words.failedTitle} path={[{ name: words.failedTitle }]}>
      <Opening small title={words.failedTitle} lead={words.failed}>
        <p>
          <WordButton onClick={() => location.reload()}>{words.again}</WordButton>
        </p>
      </Opening>
    </Page>
  );
}

export const NotFound = ({ lead = words.notFound }: { readonly lead?: string }) => (
  <Page title={words.notFoundTitle} path={[{ name: words.notFoundTitle }]}>
    <Opening small title={words.notFoundTitle} lead={lead}>
      <p>
        <Link to={paths.catalogue()}>{words.toSheets}</Link>
      </p>
    </Opening>
  </Page>
);

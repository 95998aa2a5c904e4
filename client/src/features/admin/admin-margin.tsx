import { Link } from 'react-router-dom';
import { paths } from '../../lib/paths';
import { adminStrings } from '../../strings/admin';
import { MarginBlock } from '../../ui/page/margin-block';

const words = adminStrings.more;

/** The ways between the administrators' pages. */
export const AdminMargin = () => (
  <MarginBlock title={words.title}>
    {[
      [paths.people(), words.people] as const,
      [paths.mail(), words.mail] as const,
      [paths.jobs(), words.jobs] as const,
    ].map(([to, name]) => (
      <p key={to}>
        <Link to={to}>{name}</Link>
      </p>
    ))}
  </MarginBlock>
);

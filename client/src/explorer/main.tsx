import { createGraphiQLFetcher } from '@graphiql/toolkit';
import { GraphiQL } from 'graphiql';
import 'graphiql/setup-workers/vite';
import 'graphiql/style.css';
import { createRoot } from 'react-dom/client';
import './explorer.css';

const FIRST_QUERY = `# The released sheets. Quantities are SI: K, Pa, m²/s.
# Put an API key under “Headers”: { "Authorization": "Bearer …" }
query ReleasedSheets {
  dataSheets(first: 5) {
    edges {
      node {
        code
        pair { substances { name formula } }
        current { number correlation { expression } }
      }
    }
  }
}
`;

/** The API explorer, an entry of its own: readers of sheets never load it. Everything in it comes from this service. */
const place = document.getElementById('explorer');
if (place === null) throw new Error('The page has no place for the explorer.');
createRoot(place).render(<GraphiQL fetcher={createGraphiQLFetcher({ url: '/graphql' })} defaultQuery={FIRST_QUERY} />);

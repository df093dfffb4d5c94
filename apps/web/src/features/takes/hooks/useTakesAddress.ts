import { useNavigate, useSearchParams } from 'react-router-dom';
import { pagePlace } from '../paging';
import { takesAddress, takesQuery, type TakesQuery } from '../takesQuery';

/** The sentence and the page as the address has them; a changed sentence begins at its first page. */
export function useTakesAddress() {
  const [params] = useSearchParams();
  const navigate = useNavigate();
  const query = takesQuery(params);
  return {
    query,
    place: pagePlace(params),
    change: (change: Partial<TakesQuery>) => {
      // Each further letter is not a step of its own for "back".
      const replace = Boolean(query.find && change.find);
      void navigate(takesAddress({ ...query, ...change }), { replace });
    },
    firstPage: () => navigate(takesAddress(query), { replace: true }),
  };
}

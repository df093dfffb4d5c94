import { Link, type LinkProps } from 'react-router-dom';
import { Button } from './Button';
import { useLinksAsText } from './LinksAsText';

/** A link that looks like a button because it is the next step. */
export function ButtonLink({
  to,
  look,
  children,
}: Pick<LinkProps, 'to' | 'children'> & { look?: 'solid' | 'outline' | 'plain' }) {
  if (useLinksAsText()) return null;
  return (
    <Button asChild look={look}>
      <Link to={to}>{children}</Link>
    </Button>
  );
}

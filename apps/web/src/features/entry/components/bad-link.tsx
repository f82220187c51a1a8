import { Link } from 'react-router-dom';
import { EntryPage } from './entry-page.tsx';

/** A page that only a link from an e-mail leads to, opened without its token. */
export function BadLink({ what }: { what: string }) {
  return (
    <EntryPage title="This link is incomplete">
      <p className="m-0">{what}</p>
      <p className="m-0">
        <Link to="/sign-in" className="link">
          Go to sign in
        </Link>
      </p>
    </EntryPage>
  );
}

import { useEffect, useState } from 'react';

/** Token in the fragment of a link from an e-mail, taken out of the address bar so that it stays in no history. */
export function useLinkToken(): string | null {
  const [token] = useState(() => new URLSearchParams(window.location.hash.slice(1)).get('token'));
  useEffect(() => {
    if (token !== null) window.history.replaceState(window.history.state, '', window.location.pathname);
  }, [token]);
  return token;
}

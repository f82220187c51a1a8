import { useParams } from 'react-router-dom';
import { ReleasePage } from '../features/releases/components/release-page.tsx';

export function Component() {
  const { releaseId = '' } = useParams();
  return <ReleasePage key={releaseId} releaseId={releaseId} />;
}

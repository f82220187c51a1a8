import { useParams } from 'react-router-dom';
import { VersionPage } from '../features/versions/components/version-page.tsx';

export function Component() {
  const { versionId = '' } = useParams();
  return <VersionPage key={versionId} versionId={versionId} />;
}

import { useParams } from 'react-router-dom';
import { OpenStudio } from '../features/studio/components/open-studio.tsx';

export function Component() {
  const { draftId = '' } = useParams();
  return <OpenStudio key={draftId} draftId={draftId} />;
}

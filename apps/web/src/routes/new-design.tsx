import { useParams } from 'react-router-dom';
import { NewDesignPage } from '../features/designs/components/new/new-design-page.tsx';

export function Component() {
  const { programmeId = '' } = useParams();
  return <NewDesignPage key={programmeId} programmeId={programmeId} />;
}

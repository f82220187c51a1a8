import { useParams } from 'react-router-dom';
import { DesignPage } from '../features/designs/components/design-page.tsx';

export function Component() {
  const { designId = '' } = useParams();
  return <DesignPage key={designId} designId={designId} />;
}

import { useParams } from 'react-router-dom';
import { SpecificationPage } from '../features/programmes/components/specification/specification-page.tsx';

export function Component() {
  const { programmeId = '' } = useParams();
  return <SpecificationPage key={programmeId} programmeId={programmeId} />;
}

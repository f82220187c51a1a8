import { useParams } from 'react-router-dom';
import { ProgrammePage } from '../features/programmes/components/programme/programme-page.tsx';

export function Component() {
  const { programmeId = '' } = useParams();
  return <ProgrammePage key={programmeId} programmeId={programmeId} />;
}

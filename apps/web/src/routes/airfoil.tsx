import { useParams } from 'react-router-dom';
import { AirfoilPage } from '../features/airfoils/components/airfoil-page.tsx';

export function Component() {
  const { airfoilId = '' } = useParams();
  return <AirfoilPage key={airfoilId} airfoilId={airfoilId} />;
}

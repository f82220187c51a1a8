import { useParams } from 'react-router-dom';
import { ReviewPage } from '../features/reviews/components/review-page.tsx';

export function Component() {
  const { reviewId = '' } = useParams();
  return <ReviewPage key={reviewId} reviewId={reviewId} />;
}

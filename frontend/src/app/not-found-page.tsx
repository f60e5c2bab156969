import { Link } from 'react-router-dom';
import { EmptyState } from '../ui/states/empty-state';
import { paths } from './paths';

export function NotFoundPage() {
  return (
    <EmptyState title="There is nothing at this address" level={1}>
      The address may be mistyped, or you may not be allowed to see what stands here.{' '}
      <Link to={paths.desk.to()}>Go to your desk</Link>
    </EmptyState>
  );
}

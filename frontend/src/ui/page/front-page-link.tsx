import type { ReactNode } from 'react';
import { Link } from 'react-router-dom';

/**
 * A link below a form. Leaving a field may write a remark under it, which moves what stands below just as it is clicked;
 * so the field keeps the focus until the click is through.
 */
export function FrontPageLink({ to, children }: { to: string; children: ReactNode }) {
  return (
    <Link to={to} onMouseDown={(event) => event.preventDefault()}>
      {children}
    </Link>
  );
}

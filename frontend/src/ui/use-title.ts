import { useEffect } from 'react';

/** Names the page in the browser's tab and history. */
export function useTitle(title: string | undefined): void {
  useEffect(() => {
    document.title = title ? `${title} · Bellgap` : 'Bellgap';
  }, [title]);
}

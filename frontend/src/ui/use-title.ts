import { useEffect } from 'react';

/** Names the page in the browser's tab and history; a part of a page gives no title. */
export function useTitle(title: string | undefined): void {
  useEffect(() => {
    if (title) document.title = `${title} · Bellgap`;
  }, [title]);
}

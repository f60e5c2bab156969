import { useRouteError } from 'react-router-dom';
import { ErrorState } from '../ui/states/error-state';

/** A page that failed to load or to draw; the frame around it stays. */
export function RouteFault() {
  const error = useRouteError();
  const fetching = error instanceof TypeError && /import|fetch|module/i.test(error.message);
  return (
    <ErrorState
      level={1}
      title="This page could not be shown"
      text={
        fetching
          ? 'A part of the program could not be fetched: the connection is down, or a newer version stands on the server.'
          : 'The page met something that it does not expect. Reloading may help; if it stays so, tell the administrator.'
      }
      retryLabel="Reload the page"
      retry={() => window.location.reload()}
    />
  );
}

import { Button } from 'antd';
import './states.css';

interface ErrorStateProps {
  title: string;
  text: string;
  retry?: () => unknown;
  retryLabel?: string;
}

/** An error in the place where it happened: what is wrong and what to do. */
export function ErrorState({ title, text, retry, retryLabel = 'Try again' }: ErrorStateProps) {
  return (
    <div className="state-panel state-panel-error" role="alert">
      <h2 className="state-panel-title">{title}</h2>
      <p className="state-panel-text">{text}</p>
      {retry && (
        <Button className="state-panel-act" onClick={() => void retry()}>
          {retryLabel}
        </Button>
      )}
    </div>
  );
}

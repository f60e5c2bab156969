import { Button } from 'antd';
import { useTitle } from '../use-title';
import './states.css';

interface ErrorStateProps {
  title: string;
  text: string;
  retry?: () => unknown;
  retryLabel?: string;
  /** 1 where it stands in place of a whole page. */
  level?: 1 | 2;
}

/** An error in the place where it happened: what is wrong and what to do. */
export function ErrorState({ title, text, retry, retryLabel = 'Try again', level = 2 }: ErrorStateProps) {
  useTitle(level === 1 ? title : undefined);
  const Heading = level === 1 ? 'h1' : 'h2';
  return (
    <div className="state-panel state-panel-error" role="alert">
      <Heading className="state-panel-title">{title}</Heading>
      <p className="state-panel-text">{text}</p>
      {retry && (
        <Button className="state-panel-act" onClick={() => void retry()}>
          {retryLabel}
        </Button>
      )}
    </div>
  );
}

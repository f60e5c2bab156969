import { Button } from 'antd';
import { UnsavedGuard } from '../../ui/forms/unsaved-guard';

interface Properties {
  onEdit: () => void;
  onLeave: () => void;
}

/** Asked before the first change of one who could check or approve; what was typed waits in the form meanwhile. */
export function EditQuestion({ onEdit, onLeave }: Properties) {
  return (
    <div className="notice edit-question" role="alert">
      <UnsavedGuard unsaved />
      <span>
        <b>If you edit this revision you can no longer check or approve it.</b> What you typed is not saved until you
        say so.
      </span>
      <Button size="small" onClick={onEdit}>
        Edit it all the same
      </Button>
      <Button size="small" onClick={onLeave}>
        Leave it unchanged
      </Button>
    </div>
  );
}

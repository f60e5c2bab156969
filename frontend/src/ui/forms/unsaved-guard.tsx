import { Modal } from 'antd';
import { useEffect } from 'react';
import { useBlocker } from 'react-router-dom';

/** Asks before a page with typed and unsaved words is left. */
export function UnsavedGuard({ unsaved }: { unsaved: boolean }) {
  const blocker = useBlocker(
    ({ currentLocation, nextLocation }) => unsaved && currentLocation.pathname !== nextLocation.pathname,
  );
  useEffect(() => {
    if (!unsaved) return undefined;
    const ask = (event: BeforeUnloadEvent) => event.preventDefault();
    window.addEventListener('beforeunload', ask);
    return () => window.removeEventListener('beforeunload', ask);
  }, [unsaved]);

  return (
    <Modal
      open={blocker.state === 'blocked'}
      title="Leave without saving?"
      okText="Leave"
      cancelText="Stay"
      onOk={() => blocker.proceed?.()}
      onCancel={() => blocker.reset?.()}
    >
      What you changed on this page is not saved and would be lost.
    </Modal>
  );
}

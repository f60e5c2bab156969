import { contract, verificationWords } from '@bellgap/common/api';
import { useMutation } from '@tanstack/react-query';
import { Button } from 'antd';
import { useState } from 'react';
import { failureText } from '../../api/api-error';
import { call } from '../../api/client';
import { Sheet } from '../../ui/page/sheet';

/** Checks every seal of the trail and says what was found; for administrators. */
export function VerificationSheet() {
  const [number, setNumber] = useState('');
  const [hash, setHash] = useState('');
  const verification = useMutation({
    mutationFn: () => {
      const asked = number.trim() === '' && hash.trim() === '' ? null : { number, hash };
      const knownSeal = asked && { number: Number(asked.number), hash: asked.hash.trim().toLowerCase() };
      return call(contract.verifyTrail, { body: { knownSeal } });
    },
  });
  const found = verification.data;
  return (
    <Sheet
      title="Is the trail as it was written?"
      note="Each row is sealed within seconds, and each seal rests on the one before"
    >
      <form
        className="trail-verify"
        onSubmit={(event) => {
          event.preventDefault();
          verification.mutate();
        }}
      >
        <label>
          Number of a printed seal, if you have one
          <input
            className="plain-input num"
            inputMode="numeric"
            value={number}
            onChange={({ target }) => setNumber(target.value)}
          />
        </label>
        <label>
          Its 12 digits
          <input
            className="plain-input num"
            autoComplete="off"
            spellCheck={false}
            value={hash}
            onChange={({ target }) => setHash(target.value)}
          />
        </label>
        <Button type="primary" htmlType="submit" loading={verification.isPending}>
          Verify the trail
        </Button>
      </form>
      <div role="status" className="trail-found">
        {verification.isPending && <p className="soft">Every row is read and compared; this may take a minute.</p>}
        {verification.error && <p className="bg-field-error">{failureText(verification.error)}</p>}
        {found && !verification.isPending && (
          <div className={found.sound ? 'is-sound' : 'is-unsound'}>
            {verificationWords(found).map((words) => (
              <p key={words}>{words}</p>
            ))}
          </div>
        )}
      </div>
    </Sheet>
  );
}

import { BASIS_MOVE_DONE, type BasisMove, type StandingBasis } from '@bellgap/common/api';
import { Button, Modal } from 'antd';
import { useState } from 'react';
import { dayText } from '../../ui/days';
import { BasisMoveForm, moveLabel } from './basis-move-form';
import './basis-moves.css';

/** What was done with a revision: by whom, on which day of the site, and why. */
export function BasisSignatures({ basis, zone }: { basis: StandingBasis; zone: string }) {
  if (basis.moves.length === 0) return null;
  return (
    <ol className="basis-signatures" aria-label={`Signatures of revision ${basis.revision}`}>
      {basis.moves.map(({ move, by, on, note }, index) => (
        <li key={index}>
          <b>{inCapitals(BASIS_MOVE_DONE[move])}</b> by {by} on{' '}
          <span title={`Day at the site, ${zone}`}>{dayText(on)}</span>
          {note && <q className="basis-signature-note">{note}</q>}
        </li>
      ))}
      <li className="soft">Days at the site, {zone}</li>
    </ol>
  );
}

/** The moves from where a revision stands; what cannot be done says why. */
export function BasisMoves({ code, basis }: { code: string; basis: StandingBasis }) {
  const [open, setOpen] = useState<BasisMove | null>(null);
  const end = () => setOpen(null);
  const barred = basis.allowed.filter(({ allowed, why }) => !allowed && why !== null);
  if (basis.allowed.length === 0) return null;
  return (
    <div className="basis-moves">
      <div className="basis-moves-acts">
        {basis.allowed
          .filter(({ allowed }) => allowed)
          .map(({ name }) => (
            <Button key={name} onClick={() => setOpen(name)}>
              {moveLabel(name, basis)}
            </Button>
          ))}
      </div>
      {barred.length > 0 && (
        <ul className="basis-moves-barred" aria-label="Not for you">
          {barred.map(({ name, why }) => (
            <li key={name}>
              {moveLabel(name, basis)}: {why}
            </li>
          ))}
        </ul>
      )}
      <Modal
        open={open !== null}
        title={open && `${moveLabel(open, basis)}: ${basis.number} revision ${basis.revision}`}
        footer={null}
        destroyOnHidden
        onCancel={end}
      >
        {open && <BasisMoveForm code={code} basis={basis} move={open} done={end} />}
      </Modal>
    </div>
  );
}

const inCapitals = (words: string) => words.charAt(0).toUpperCase() + words.slice(1);

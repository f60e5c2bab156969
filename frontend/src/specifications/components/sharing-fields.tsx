import { useForm } from '../hooks/form-context';
import { applies } from '../model/applies';
import { faultAt } from '../model/faults';
import { valueAt } from '../model/form';
import { NumberAt } from './fields-at';
import './sharing-fields.css';

const SHARING_PATHS = ['string.sharing.pinToEarthRatio', 'string.sharing.pinToLineRatio'] as const;

/** Capacitances of the voltage sharing: folded away, since the usual ones serve and no count rests on them. */
export function SharingFields() {
  const { values, unit, faults } = useForm();
  if (!applies(SHARING_PATHS[0], values, unit)) return null;
  const isEntered = SHARING_PATHS.some((path) => valueAt(values, path) !== null || values.unread[path] !== undefined);
  const isFaulty = SHARING_PATHS.some((path) => faultAt(faults, path) !== undefined);
  return (
    <details className="sharing-fields" open={isFaulty || undefined}>
      <summary>
        Voltage sharing <span>{isEntered ? 'capacitances entered' : 'usual capacitances'}</span>
      </summary>
      <NumberAt path="string.sharing.pinToEarthRatio" note="left empty: 0.1, usual" />
      <NumberAt path="string.sharing.pinToLineRatio" note="left empty: 0, usual" />
    </details>
  );
}

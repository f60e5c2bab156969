import { probabilityParts } from '../model/figures';

/** A probability as it is read: three digits, and a power of ten where it is small. */
export function Probability({ value }: { value: number }) {
  const { figure, power } = probabilityParts(value);
  return (
    <span className="num risk-probability">
      {figure}
      {power !== null && (
        <>
          {' × 10'}
          <sup>{`−${-power}`}</sup>
        </>
      )}
    </span>
  );
}

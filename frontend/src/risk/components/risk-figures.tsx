import { SourceWords } from '../../ui/trace';
import { oneInText, type RiskFigure, type RiskRow } from '../model/figures';
import { Probability } from './probability';

function Row({ row }: { row: RiskRow }) {
  const { label, probability, line } = row;
  return (
    <div className="risk-row">
      <dt>{label}</dt>
      <dd>
        <Probability value={probability} />
        <small>{oneInText(probability)}</small>
      </dd>
      {line && (
        <dd className="risk-source">
          <span className="num">{line.formula}</span>
          <SourceWords source={line.source} />
        </dd>
      )}
    </div>
  );
}

/** Each risk with its formula, clause and status; tail beside tail where they differ. */
export function RiskFigures({ figures }: { figures: readonly RiskFigure[] }) {
  return (
    <div className="risk-figures">
      {figures.map(({ key, title, aside, rows }) => (
        <section key={key} aria-labelledby={`risk-${key}`}>
          <h3 id={`risk-${key}`}>
            {title} {aside && <span>{aside}</span>}
          </h3>
          <dl>
            {rows.map((row) => (
              <Row key={row.label} row={row} />
            ))}
          </dl>
        </section>
      ))}
    </div>
  );
}

import { contract, type SourceDifference } from '@bellgap/common/api';
import { CHOICE_LABELS } from '@bellgap/common/schemas';
import { useQuery } from '@tanstack/react-query';
import { Link } from 'react-router-dom';
import { queryOf } from '../../api/queries';
import { paths } from '../../app/paths';
import { formatFull } from '../../ui/figure';
import { Sheet } from '../../ui/page/sheet';
import { QueryState } from '../../ui/states/query-state';
import { byTopic, sourceText, type DifferingFigure } from '../model/differences';
import './differences.css';

function FigureRow({ one, unit, hereKey }: { one: DifferingFigure; unit: string; hereKey: string | null }) {
  const { figure, figureUpTo, printedFor, source, entryKey, isUsed } = one;
  const words = sourceText(source);
  return (
    <li className={isUsed ? 'is-used' : undefined}>
      <span className="difference-figure">
        <span className="num">
          {formatFull(figure)}
          {figureUpTo !== null && ` to ${formatFull(figureUpTo)}`}
        </span>
        {unit && <span className="difference-unit"> {unit}</span>}
      </span>
      <span>{printedFor}</span>
      <span>
        {entryKey === null || entryKey === hereKey ? words : <Link to={paths.table.to(entryKey)}>{words}</Link>}
        <small className={`reference-status is-${source.status}`}>{CHOICE_LABELS.status[source.status]}</small>
      </span>
      <span className="difference-use">{isUsed ? 'used' : 'compared only'}</span>
    </li>
  );
}

function Difference({ difference, hereKey = null }: { difference: SourceDifference; hereKey?: string | null }) {
  const { quantity, unit, figures, choice } = difference;
  return (
    <article className="difference">
      <h3>{quantity}</h3>
      <ul className="difference-figures">
        {figures.map((one) => (
          <FigureRow
            key={`${one.source.document}/${one.printedFor}/${one.figure}`}
            one={one}
            unit={unit}
            hereKey={hereKey}
          />
        ))}
      </ul>
      <p className="difference-choice">{choice}</p>
    </article>
  );
}

/** Every quantity of which the sources do not say the same, topic by topic. */
export function DifferencesByTopic() {
  const differences = useQuery(queryOf(contract.sourceDifferences));
  return (
    <Sheet title="Where sources differ" note="every figure with its source, which is used, and why" flush>
      <QueryState query={differences} what="Where sources differ">
        {(all) =>
          byTopic(all).map(({ topic, of }, index) => (
            <details key={topic} className="difference-topic" open={index === 0}>
              <summary>
                {topic}
                <span className="difference-count">
                  {of.length} {of.length === 1 ? 'quantity' : 'quantities'}
                </span>
              </summary>
              {of.map((one) => (
                <Difference key={one.id} difference={one} />
              ))}
            </details>
          ))
        }
      </QueryState>
    </Sheet>
  );
}

/** What other sources say of figures of one table or formula; nothing where none is known to differ. */
export function DifferencesOf({ entryKey }: { entryKey: string }) {
  const differences = useQuery(queryOf(contract.sourceDifferences));
  const own = (differences.data ?? []).filter(({ figures }) => figures.some((one) => one.entryKey === entryKey));
  if (own.length === 0) return null;
  return (
    <Sheet title="Where sources differ" note="every figure with its source, which is used, and why" flush>
      {own.map((one) => (
        <Difference key={one.id} difference={one} hereKey={entryKey} />
      ))}
    </Sheet>
  );
}

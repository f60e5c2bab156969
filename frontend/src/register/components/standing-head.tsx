import { SHEET_STANDING_LABELS, type IssuedSheet } from '@bellgap/common/api';
import { Link } from 'react-router-dom';
import { paths } from '../../app/paths';
import { Moment } from '../../ui/moment';
import { StandingShape } from '../../ui/standing';

function Since({ sheet }: { sheet: IssuedSheet }) {
  const { standing, standingSince, standingBy, standingReason, successor, issuedAt } = sheet;
  if (standing === 'current') {
    return (
      <>
        since <Moment at={issuedAt} />. A print is good while the code on it says so.
      </>
    );
  }
  return (
    <>
      {standingSince && (
        <>
          since <Moment at={standingSince} />
        </>
      )}
      {standingBy && ` by ${standingBy}`}
      {standingReason && `: ${standingReason.replace(/[.\s]+$/, '')}`}.{' '}
      {successor ? (
        <>
          Use <Link to={paths.issuedSheet.to(successor.id)}>revision {successor.label}</Link> instead.
        </>
      ) : (
        'Do not build or buy from it.'
      )}
    </>
  );
}

/** Whether the sheet is in force: shape, word, since when and why. */
export function StandingHead({ sheet }: { sheet: IssuedSheet }) {
  const { standing, successor } = sheet;
  return (
    <div className={`standing-head is-${standing}`} role="status">
      <StandingShape standing={standing} sizePx={26} />
      <b>
        {SHEET_STANDING_LABELS[standing]}
        {standing === 'superseded' && successor && ` by revision ${successor.label}`}
      </b>
      <p>
        <Since sheet={sheet} />
      </p>
    </div>
  );
}

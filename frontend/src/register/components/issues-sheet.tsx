import type { IssuedSheet } from '@bellgap/common/api';
import { Link } from 'react-router-dom';
import { paths } from '../../app/paths';
import '../../ui/data-table/data-table.css';
import { Moment } from '../../ui/moment';
import { Sheet } from '../../ui/page/sheet';
import { StandingMark } from '../../ui/standing';

/** Every issue of the specification, the newest first. */
export function IssuesSheet({ sheet: { id, number, issues } }: { sheet: IssuedSheet }) {
  return (
    <Sheet title={`Issues of ${number}`} flush>
      <div className="table-scroll" role="region" aria-label={`Issues of ${number}, table`} tabIndex={0}>
        <table className="rows">
          <thead>
            <tr>
              <th scope="col">Revision</th>
              <th scope="col">Standing</th>
              <th scope="col">Issued</th>
            </tr>
          </thead>
          <tbody>
            {issues.map((issue) => (
              <tr key={issue.id}>
                <td>
                  {issue.id === id ? (
                    <>
                      <span className="num">{issue.label}</span> <span className="soft">this one</span>
                    </>
                  ) : (
                    <Link to={paths.issuedSheet.to(issue.id)} className="num">
                      {issue.label}
                    </Link>
                  )}
                </td>
                <td>
                  <StandingMark standing={issue.standing} />
                </td>
                <td>
                  <Moment at={issue.issuedAt} />
                </td>
              </tr>
            ))}
          </tbody>
        </table>
      </div>
    </Sheet>
  );
}

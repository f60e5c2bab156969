import { recordLabel, type TrailEvent } from '@bellgap/common/api';
import type { ReactNode } from 'react';
import { Link } from 'react-router-dom';
import { paths } from '../../app/paths';

/** What a row of the trail is about, with the way to it where there is a page. */
export function RecordWords({ event }: { event: TrailEvent }) {
  return (
    <span className="trail-record">
      {aboutOf(event)}{' '}
      <Link className="trail-only" to={paths.trail.to({ entity: event.entity, entityId: event.entityId })}>
        only this
      </Link>
    </span>
  );
}

function aboutOf({ entity, entityId, projectCode, specification, personName }: TrailEvent): ReactNode {
  if (specification && projectCode) {
    return (
      <>
        <Link className="num" to={paths.specification.to(projectCode, specification.number)}>
          {specification.number}
        </Link>{' '}
        rev <span className="num">{specification.label}</span>
        {entity !== 'revision' && `, ${recordLabel(entity).toLowerCase()}`}
      </>
    );
  }
  if (entity === 'design-basis' && projectCode) {
    return (
      <>
        <Link className="num" to={paths.designBasis.to(projectCode)}>
          {projectCode}
        </Link>{' '}
        design basis rev <span className="num">{entityId.split(' ')[1]}</span>
      </>
    );
  }
  if (entity === 'table') {
    return (
      <Link className="num" to={paths.table.to(entityId)}>
        {entityId}
      </Link>
    );
  }
  return (
    <>
      {personName ?? recordLabel(entity)}
      {projectCode && (
        <>
          ,{' '}
          <Link className="num" to={paths.project.to(projectCode)}>
            {projectCode}
          </Link>
        </>
      )}
    </>
  );
}

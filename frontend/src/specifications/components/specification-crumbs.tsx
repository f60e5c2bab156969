import type { Revision } from '@bellgap/common/api';
import type { ReactNode } from 'react';
import { Link } from 'react-router-dom';
import { paths } from '../../app/paths';
import { RevisionStateMark } from '../../ui/revision-state';

interface Properties {
  revision: Revision;
  title: string;
  children?: ReactNode;
}

/** Where the page stands: project, number, title, revision and its state. */
export function SpecificationCrumbs({ revision, title, children }: Properties) {
  const { projectCode, projectTitle, number, label, state, labels } = revision;
  const before = labels.filter((one) => one !== label);
  return (
    <nav className="specification-crumbs" aria-label="Where this page stands">
      <Link to={paths.project.to(projectCode)}>
        {projectCode} {projectTitle}
      </Link>
      <span aria-hidden="true">/</span>
      <h1>
        <b>{number}</b> <span>{title}</span>
      </h1>
      <span aria-hidden="true">/</span>
      <span>
        revision <b>{label}</b>
        {before.length > 0 && ` (was ${before.join(', ')})`}
      </span>
      <RevisionStateMark state={state} />
      <Link to={paths.trail.to({ project: projectCode, specification: number })}>Trail</Link>
      {children}
    </nav>
  );
}

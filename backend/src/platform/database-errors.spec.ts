import { domainErrorOfConstraint } from './database-errors';

describe('rules that the database states', () => {
  const refusalOf = (code: string, constraint: string) => {
    const error = domainErrorOfConstraint({ code, constraint });
    return error && [error.code, error.message];
  };

  it('come back in the words of the user', () => {
    expect(refusalOf('23505', 'projects_code_key')).toEqual([
      'already-exists',
      'Code: a project with this code exists already',
    ]);
    const ownWork = [
      'forbidden',
      'Nobody checks or approves what he has worked on himself: author, checker and approver are three people.',
    ];
    expect(refusalOf('23514', 'revisions_own_work')).toEqual(ownWork);
    expect(refusalOf('23514', 'revisions_three_people_check')).toEqual(ownWork);
    expect(refusalOf('23505', 'revisions_in_work_key')).toEqual([
      'wrong-state',
      'A revision of this specification is in work already.',
    ]);
    expect(refusalOf('23514', 'revisions_state_order')?.[0]).toBe('wrong-state');
  });

  it('are faults of the product where nobody has words for them', () => {
    expect(refusalOf('23514', 'revisions_units_check')).toBeNull();
    expect(refusalOf('23503', 'revisions_own_work')).toBeNull();
    expect(domainErrorOfConstraint(new Error('else'))).toBeNull();
    expect(domainErrorOfConstraint(null)).toBeNull();
  });
});

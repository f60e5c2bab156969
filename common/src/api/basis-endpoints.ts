import { basisMoveSchema } from '../schemas/basis-moves';
import { standingBasisAnswer } from './project-answers';
import { endpoint } from './endpoint';

/** Endpoints of the way of a design basis from draft to issued. */
export const basisEndpoints = {
  moveBasis: endpoint({
    method: 'POST',
    path: '/projects/:code/design-basis/:revision/moves',
    summary: 'Submit, check, return, issue or withdraw a revision of the design basis',
    access: ['engineer', 'checker', 'approver'],
    body: basisMoveSchema,
    answer: standingBasisAnswer.required(),
    success: 201,
  }),
} as const;

import * as yup from 'yup';
import { BASIS_MOVE_NAMES, basisMoveNeedsNote, basisMoveSigns, type BasisMove } from '../api/basis-moves';
import { plainText } from './parts';

/** What is asked when a revision of a design basis goes on or back. */
export const basisMoveSchema = yup
  .object({
    move: yup.string().oneOf(BASIS_MOVE_NAMES, 'Move: choose one of the list').required('Move: is needed'),
    note: plainText('Note', 1000)
      .defined()
      .when('move', ([move], schema) =>
        isMove(move) && basisMoveNeedsNote(move)
          ? schema.test('needed', 'Reason: say why', (note) => Boolean(note?.trim()))
          : schema,
      ),
    password: yup
      .string()
      .typeError('Password: text is needed')
      .nullable()
      .defined()
      .max(1000)
      .when('move', ([move], schema) =>
        isMove(move) && basisMoveSigns(move)
          ? schema.test('needed', 'Password: is needed to sign', (password) => Boolean(password))
          : schema,
      ),
  })
  .noUnknown();

const isMove = (move: unknown): move is BasisMove => BASIS_MOVE_NAMES.includes(move as BasisMove);

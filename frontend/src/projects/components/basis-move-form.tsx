import {
  TRANSITIONS,
  basisMoveNeedsNote,
  basisMoveSigns,
  basisTransition,
  contract,
  type BasisMove,
  type BodyOf,
  type StandingBasis,
} from '@bellgap/common/api';
import { basisMoveSchema } from '@bellgap/common/schemas';
import { useQueryClient } from '@tanstack/react-query';
import { Button } from 'antd';
import { call } from '../../api/client';
import { keyOf } from '../../api/queries';
import { SchemaFormView } from '../../ui/forms/schema-form';
import { LongTextField, PasswordField } from '../../ui/forms/text-fields';
import { useSchemaForm } from '../../ui/forms/use-schema-form';
import './basis-moves.css';

/** What follows from a move, said before it is made. */
const CONSEQUENCES: Record<BasisMove, string> = {
  submit: 'It goes to the checkers of this project. While it is in check it can still be revised by a newer revision.',
  check: 'You sign that you have checked it yourself. An approver issues it.',
  return: 'It becomes a draft again; who wrote it is told why.',
  issue: 'It becomes the one in force: new specifications rest on it, and drafts on an older revision are marked.',
  withdraw: 'It ceases to be in force, and none is issued in its place until the next. It cannot be undone.',
};

/** The words of the move from where the basis stands, out of the one table of transitions. */
export function moveLabel(move: BasisMove, { state }: Pick<StandingBasis, 'state'>): string {
  const name = basisTransition(move, state);
  return name ? TRANSITIONS[name].label : move;
}

interface BasisMoveFormProps {
  code: string;
  basis: StandingBasis;
  move: BasisMove;
  done(): void;
}

export function BasisMoveForm({ code, basis, move, done }: BasisMoveFormProps) {
  const queryClient = useQueryClient();
  const signs = basisMoveSigns(move);
  const form = useSchemaForm({
    schema: basisMoveSchema,
    initialValues: { move, note: '', password: '' },
    toBody: ({ note, password }) => ({ move, note: note.trim(), password: signs ? password : null }),
    submit: async (body: BodyOf<typeof contract.moveBasis>) => {
      await call(contract.moveBasis, { params: { code, revision: String(basis.revision) }, body });
      const touched = [contract.designBasis, contract.project, contract.projects, contract.specifications];
      await Promise.all(
        [...touched, contract.revision, contract.approval, contract.desk].map((endpoint) =>
          queryClient.invalidateQueries({ queryKey: keyOf(endpoint) }),
        ),
      );
      done();
    },
  });
  return (
    <SchemaFormView
      form={form}
      label={moveLabel(move, basis)}
      submitLabel={moveLabel(move, basis)}
      acts={<Button onClick={done}>Cancel</Button>}
    >
      <p className="soft basis-move-words">{CONSEQUENCES[move]}</p>
      <LongTextField form={form} path="note" label={basisMoveNeedsNote(move) ? 'Reason' : 'Note, if any'} rows={2} />
      {signs && <PasswordField form={form} path="password" label="Password" autoComplete="current-password" />}
    </SchemaFormView>
  );
}

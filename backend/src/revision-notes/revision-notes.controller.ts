import { Body, Controller, Param } from '@nestjs/common';
import { contract, type BodyOf } from '@bellgap/common/api';
import { CurrentPerson, type SignedIn } from '../platform/person';
import { Route } from '../platform/route';
import { RevisionNotesService } from './revision-notes.service';

interface RevisionParams {
  code: string;
  number: string;
  label: string;
}

const addressOf = ({ code, number, label }: RevisionParams) => ({ projectCode: code, number, label });

@Controller()
export class RevisionNotesController {
  constructor(private readonly notes: RevisionNotesService) {}

  @Route(contract.revisionNotes)
  list(@CurrentPerson() person: SignedIn, @Param() params: RevisionParams) {
    return this.notes.list(person, addressOf(params));
  }

  @Route(contract.writeRevisionNote)
  write(
    @CurrentPerson() person: SignedIn,
    @Param() params: RevisionParams,
    @Body() body: BodyOf<typeof contract.writeRevisionNote>,
  ) {
    return this.notes.write(person, addressOf(params), body);
  }

  @Route(contract.removeRevisionNote)
  remove(@CurrentPerson() person: SignedIn, @Param() params: RevisionParams & { noteId: string }) {
    return this.notes.remove(person, addressOf(params), params.noteId);
  }
}

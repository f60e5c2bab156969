import { Controller, Header, Param, Query, StreamableFile } from '@nestjs/common';
import { contract, type QueryOf } from '@bellgap/common/api';
import { CurrentPerson, type SignedIn } from '../platform/person';
import { Route } from '../platform/route';
import { ConcessionsService } from './concessions.service';
import { RegisterService } from './register.service';

@Controller()
export class RegisterController {
  constructor(
    private readonly register: RegisterService,
    private readonly concessionsService: ConcessionsService,
  ) {}

  @Route(contract.sheets)
  list(@CurrentPerson() person: SignedIn, @Query() query: QueryOf<typeof contract.sheets>) {
    return this.register.list(person, query);
  }

  @Route(contract.issuedSheet)
  get(@CurrentPerson() person: SignedIn, @Param('id') id: string) {
    return this.register.get(person, id);
  }

  @Route(contract.issuedSheetFile)
  @Header('Content-Security-Policy', "sandbox; default-src 'none'")
  @Header('X-Content-Type-Options', 'nosniff')
  async file(@CurrentPerson() person: SignedIn, @Param('id') id: string) {
    const { name, bytes } = await this.register.file(person, id);
    return new StreamableFile(bytes, {
      type: contract.issuedSheetFile.file,
      disposition: `attachment; filename="${name}"`,
      length: bytes.length,
    });
  }

  @Route(contract.concessions)
  concessions(@CurrentPerson() person: SignedIn, @Query() query: QueryOf<typeof contract.concessions>) {
    return this.concessionsService.list(person, query);
  }
}

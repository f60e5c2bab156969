import { Controller, Header, Param, StreamableFile } from '@nestjs/common';
import { contract } from '@bellgap/common/api';
import { CurrentPerson, type SignedIn } from '../platform/person';
import { Route } from '../platform/route';
import { SheetsService } from './sheets.service';

interface RevisionParams {
  code: string;
  number: string;
  label: string;
}

const addressOf = ({ code, number, label }: RevisionParams) => ({ projectCode: code, number, label });

@Controller()
export class SheetsController {
  constructor(private readonly sheets: SheetsService) {}

  @Route(contract.drawSheet)
  draw(@CurrentPerson() person: SignedIn, @Param() params: RevisionParams) {
    return this.sheets.draw(person, addressOf(params));
  }

  @Route(contract.sheetFile)
  @Header('Content-Security-Policy', "sandbox; default-src 'none'")
  @Header('X-Content-Type-Options', 'nosniff')
  async file(@CurrentPerson() person: SignedIn, @Param() params: RevisionParams) {
    const { name, bytes } = await this.sheets.file(person, addressOf(params));
    return new StreamableFile(bytes, {
      type: contract.sheetFile.file,
      disposition: `attachment; filename="${name}"`,
      length: bytes.length,
    });
  }
}

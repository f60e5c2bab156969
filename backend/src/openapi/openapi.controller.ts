import { Controller, Get, Header } from '@nestjs/common';
import { Open } from '../platform/route';
import { openApiDocument } from './openapi-document';

@Controller()
export class OpenApiController {
  private readonly document = openApiDocument();

  @Open()
  @Get('/api/openapi.json')
  @Header('Cache-Control', 'no-cache')
  openApi(): object {
    return this.document;
  }
}

import { Body, Controller, Param, Query } from '@nestjs/common';
import { contract, type AnswerOf, type BodyOf, type QueryOf } from '@bellgap/common/api';
import { CurrentPerson, type SignedIn } from '../platform/person';
import { Route } from '../platform/route';
import { GrantsService } from './grants.service';
import { UsersService } from './users.service';

@Controller()
export class UsersController {
  constructor(
    private readonly usersService: UsersService,
    private readonly grants: GrantsService,
  ) {}

  @Route(contract.users)
  users(@Query() query: QueryOf<typeof contract.users>): Promise<AnswerOf<typeof contract.users>> {
    return this.usersService.list(query);
  }

  @Route(contract.createUser)
  createUser(
    @CurrentPerson() person: SignedIn,
    @Body() body: BodyOf<typeof contract.createUser>,
  ): Promise<AnswerOf<typeof contract.createUser>> {
    return this.usersService.create(person, body);
  }

  @Route(contract.updateUser)
  updateUser(
    @CurrentPerson() person: SignedIn,
    @Param('id') id: string,
    @Body() body: BodyOf<typeof contract.updateUser>,
  ): Promise<AnswerOf<typeof contract.updateUser>> {
    return this.usersService.update(person, id, body);
  }

  @Route(contract.inviteUser)
  inviteUser(
    @CurrentPerson() person: SignedIn,
    @Param('id') id: string,
  ): Promise<AnswerOf<typeof contract.inviteUser>> {
    return this.usersService.invite(person, id);
  }

  @Route(contract.grantRole)
  grantRole(
    @CurrentPerson() person: SignedIn,
    @Param('id') id: string,
    @Body() body: BodyOf<typeof contract.grantRole>,
  ): Promise<AnswerOf<typeof contract.grantRole>> {
    return this.grants.grant(person, id, body);
  }

  @Route(contract.endGrant)
  endGrant(
    @CurrentPerson() person: SignedIn,
    @Param('id') id: string,
    @Param('grantId') grantId: string,
  ): Promise<void> {
    return this.grants.end(person, id, grantId);
  }
}

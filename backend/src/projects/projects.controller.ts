import { Body, Controller, Param, Query } from '@nestjs/common';
import { contract, type AnswerOf, type BodyOf, type Project, type QueryOf } from '@bellgap/common/api';
import { CurrentPerson, type SignedIn } from '../platform/person';
import { IfMatch, Route } from '../platform/route';
import { Versioned } from '../platform/versions';
import { ProjectsService } from './projects.service';

@Controller()
export class ProjectsController {
  constructor(private readonly projectsService: ProjectsService) {}

  @Route(contract.projects)
  projects(
    @CurrentPerson() person: SignedIn,
    @Query() query: QueryOf<typeof contract.projects>,
  ): Promise<AnswerOf<typeof contract.projects>> {
    return this.projectsService.list(person, query);
  }

  @Route(contract.createProject)
  async createProject(
    @CurrentPerson() person: SignedIn,
    @Body() body: BodyOf<typeof contract.createProject>,
  ): Promise<Versioned<Project>> {
    return versioned(await this.projectsService.create(person, body));
  }

  @Route(contract.project)
  async project(@CurrentPerson() person: SignedIn, @Param('code') code: string): Promise<Versioned<Project>> {
    return versioned(await this.projectsService.get(person, code));
  }

  @Route(contract.updateProject)
  async updateProject(
    @CurrentPerson() person: SignedIn,
    @Param('code') code: string,
    @IfMatch() version: number,
    @Body() body: BodyOf<typeof contract.updateProject>,
  ): Promise<Versioned<Project>> {
    return versioned(await this.projectsService.update(person, code, version, body));
  }

  @Route(contract.towerFamilies)
  towerFamilies(
    @CurrentPerson() person: SignedIn,
    @Param('code') code: string,
  ): Promise<AnswerOf<typeof contract.towerFamilies>> {
    return this.projectsService.towerFamilies(person, code);
  }
}

const versioned = (project: Project) => new Versioned(project, project.lockVersion);

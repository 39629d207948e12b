import { Body, Controller, Get, Param, ParseIntPipe, Post, Query } from '@nestjs/common';
import {
  ApiBearerAuth,
  ApiCreatedResponse,
  ApiOkResponse,
  ApiQuery,
  ApiTags,
} from '@nestjs/swagger';
import { ApiProblems } from '../common/decorators/api-problems.decorator';
import { CurrentPerson } from '../common/decorators/current-person.decorator';
import { Person } from '../people/person.model';
import {
  CreateFamilyDto,
  CreateFamilyVersionDto,
  FamilyDto,
  FamilySummaryDto,
} from './dto/family.dto';
import { FamiliesService } from './families.service';

@ApiTags('families')
@ApiBearerAuth()
@Controller('families')
export class FamiliesController {
  constructor(private readonly families: FamiliesService) {}

  @Get()
  @ApiQuery({ name: 'search', required: false })
  @ApiOkResponse({ type: [FamilySummaryDto] })
  @ApiProblems(401)
  list(
    @CurrentPerson() actor: Person,
    @Query('search') search?: string,
  ): Promise<FamilySummaryDto[]> {
    return this.families.list(actor, String(search ?? ''));
  }

  @Post()
  @ApiCreatedResponse({ type: FamilyDto })
  @ApiProblems(400, 401, 403, 422)
  create(@CurrentPerson() actor: Person, @Body() body: CreateFamilyDto): Promise<FamilyDto> {
    return this.families.create(actor, body);
  }

  @Get(':id')
  @ApiOkResponse({ type: FamilyDto })
  @ApiProblems(401, 404)
  get(@CurrentPerson() actor: Person, @Param('id', ParseIntPipe) id: number): Promise<FamilyDto> {
    return this.families.get(actor, id);
  }

  @Post(':id/versions')
  @ApiCreatedResponse({ type: FamilyDto })
  @ApiProblems(400, 401, 403, 404, 409, 422)
  revise(
    @CurrentPerson() actor: Person,
    @Param('id', ParseIntPipe) id: number,
    @Body() body: CreateFamilyVersionDto,
  ): Promise<FamilyDto> {
    return this.families.revise(actor, id, body);
  }
}

import {
  Body,
  Controller,
  Get,
  HttpCode,
  Param,
  ParseIntPipe,
  Patch,
  Post,
  Query,
} from '@nestjs/common';
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
import { CASE_STATES } from './case.model';
import { CasesService } from './cases.service';
import { CaseDto, CaseSummaryDto } from './dto/case.dto';
import { ChangeCaseDto, CloseCaseDto, OpenCaseDto } from './dto/change-case.dto';

@ApiTags('cases')
@ApiBearerAuth()
@Controller('cases')
export class CasesController {
  constructor(private readonly cases: CasesService) {}

  @Get()
  @ApiQuery({ name: 'state', required: false, enum: ['open', 'all', ...CASE_STATES] })
  @ApiQuery({ name: 'search', required: false })
  @ApiQuery({ name: 'mine', required: false, description: '1 for the asking person’s own cases.' })
  @ApiOkResponse({ type: [CaseSummaryDto] })
  @ApiProblems(401)
  list(
    @CurrentPerson() actor: Person,
    @Query('state') state?: string,
    @Query('search') search?: string,
    @Query('mine') mine?: string,
  ): Promise<CaseSummaryDto[]> {
    const isMine = mine === '1' || mine === 'true';
    return this.cases.list(actor, {
      state: state && String(state),
      search: search && String(search),
      isMine,
    });
  }

  @Post()
  @ApiCreatedResponse({ type: CaseDto })
  @ApiProblems(400, 401, 422)
  open(@CurrentPerson() actor: Person, @Body() body: OpenCaseDto): Promise<CaseDto> {
    return this.cases.open(actor, body);
  }

  @Get(':id')
  @ApiOkResponse({ type: CaseDto })
  @ApiProblems(401, 404)
  get(@CurrentPerson() actor: Person, @Param('id', ParseIntPipe) id: number): Promise<CaseDto> {
    return this.cases.get(actor, id);
  }

  @Patch(':id')
  @ApiOkResponse({ type: CaseDto })
  @ApiProblems(400, 401, 403, 404, 409, 422)
  change(
    @CurrentPerson() actor: Person,
    @Param('id', ParseIntPipe) id: number,
    @Body() body: ChangeCaseDto,
  ): Promise<CaseDto> {
    return this.cases.change(actor, id, body);
  }

  @Post(':id/cautions')
  @HttpCode(200)
  @ApiOkResponse({ type: CaseDto })
  @ApiProblems(401, 404)
  acknowledge(
    @CurrentPerson() actor: Person,
    @Param('id', ParseIntPipe) id: number,
  ): Promise<CaseDto> {
    return this.cases.acknowledgeCautions(actor, id);
  }

  @Post(':id/close')
  @HttpCode(200)
  @ApiOkResponse({ type: CaseDto })
  @ApiProblems(400, 401, 403, 404, 422)
  close(
    @CurrentPerson() actor: Person,
    @Param('id', ParseIntPipe) id: number,
    @Body() body: CloseCaseDto,
  ): Promise<CaseDto> {
    return this.cases.close(actor, id, body);
  }

  @Post(':id/reopen')
  @HttpCode(200)
  @ApiOkResponse({ type: CaseDto })
  @ApiProblems(401, 403, 404)
  reopen(@CurrentPerson() actor: Person, @Param('id', ParseIntPipe) id: number): Promise<CaseDto> {
    return this.cases.reopen(actor, id);
  }
}

import { Body, Controller, Get, HttpCode, Param, ParseIntPipe, Post } from '@nestjs/common';
import { ApiBearerAuth, ApiOkResponse, ApiTags } from '@nestjs/swagger';
import { ApiProblems } from '../common/decorators/api-problems.decorator';
import { CurrentPerson } from '../common/decorators/current-person.decorator';
import { Person } from '../people/person.model';
import { DiagnosisService } from './diagnosis.service';
import {
  AskClosedFormDto,
  ClosedFormDto,
  CompareDto,
  DiagnosisDto,
  WorkingDto,
} from './dto/diagnosis.dto';

@ApiTags('diagnosis')
@ApiBearerAuth()
@Controller('cases/:id')
export class DiagnosisController {
  constructor(private readonly diagnosis: DiagnosisService) {}

  @Post('diagnosis')
  @HttpCode(200)
  @ApiOkResponse({ type: DiagnosisDto })
  @ApiProblems(401, 404, 422)
  diagnose(
    @CurrentPerson() actor: Person,
    @Param('id', ParseIntPipe) id: number,
  ): Promise<DiagnosisDto> {
    return this.diagnosis.diagnose(actor, id);
  }

  @Get('diagnosis')
  @ApiOkResponse({ type: DiagnosisDto })
  @ApiProblems(401, 404)
  latest(
    @CurrentPerson() actor: Person,
    @Param('id', ParseIntPipe) id: number,
  ): Promise<DiagnosisDto> {
    return this.diagnosis.latest(actor, id);
  }

  @Get('compare')
  @ApiOkResponse({ type: CompareDto })
  @ApiProblems(401, 404, 422)
  compare(
    @CurrentPerson() actor: Person,
    @Param('id', ParseIntPipe) id: number,
  ): Promise<CompareDto> {
    return this.diagnosis.compare(actor, id);
  }

  @Get('working')
  @ApiOkResponse({ type: WorkingDto })
  @ApiProblems(401, 404, 422)
  working(
    @CurrentPerson() actor: Person,
    @Param('id', ParseIntPipe) id: number,
  ): Promise<WorkingDto> {
    return this.diagnosis.working(actor, id);
  }

  @Post('working/closed-form')
  @HttpCode(200)
  @ApiOkResponse({ type: ClosedFormDto })
  @ApiProblems(400, 401, 404, 422)
  closedForm(
    @CurrentPerson() actor: Person,
    @Param('id', ParseIntPipe) id: number,
    @Body() body: AskClosedFormDto,
  ): Promise<ClosedFormDto> {
    return this.diagnosis.closedForm(actor, id, body);
  }
}

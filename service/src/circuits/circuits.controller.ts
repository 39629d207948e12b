import { Body, Controller, HttpCode, Post } from '@nestjs/common';
import { ApiBearerAuth, ApiOkResponse, ApiTags } from '@nestjs/swagger';
import { ApiProblems } from '../common/decorators/api-problems.decorator';
import { CurrentPerson } from '../common/decorators/current-person.decorator';
import { Person } from '../people/person.model';
import { CircuitsService } from './circuits.service';
import {
  CheckCircuitDto,
  CheckedCircuitDto,
  ImportCsvDto,
  ImportedCircuitDto,
  SolveCircuitDto,
  SolvedCircuitDto,
} from './dto/circuits.dto';

@ApiTags('circuits')
@ApiBearerAuth()
@Controller('circuits')
export class CircuitsController {
  constructor(private readonly circuits: CircuitsService) {}

  @Post('check')
  @HttpCode(200)
  @ApiOkResponse({ type: CheckedCircuitDto })
  @ApiProblems(400, 401)
  check(@CurrentPerson() actor: Person, @Body() body: CheckCircuitDto): CheckedCircuitDto {
    return this.circuits.check(actor, body.netlist);
  }

  @Post('import-csv')
  @HttpCode(200)
  @ApiOkResponse({ type: ImportedCircuitDto })
  @ApiProblems(400, 401, 422)
  importCsv(@CurrentPerson() actor: Person, @Body() body: ImportCsvDto): ImportedCircuitDto {
    return this.circuits.importCsv(actor, body);
  }

  @Post('solve')
  @HttpCode(200)
  @ApiOkResponse({ type: SolvedCircuitDto })
  @ApiProblems(400, 401, 422)
  solve(@CurrentPerson() actor: Person, @Body() body: SolveCircuitDto): Promise<SolvedCircuitDto> {
    return this.circuits.solve(actor, body);
  }
}

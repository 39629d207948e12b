import { Controller, Get, Param } from '@nestjs/common';
import { ApiBearerAuth, ApiOkResponse, ApiTags } from '@nestjs/swagger';
import { ApiProblems } from '../common/decorators/api-problems.decorator';
import { CurrentPerson } from '../common/decorators/current-person.decorator';
import { Person } from '../people/person.model';
import { RuleDto, RuleListDto } from './dto/rule.dto';
import { RulesService } from './rules.service';

@ApiTags('rules')
@ApiBearerAuth()
@Controller('rules')
export class RulesController {
  constructor(private readonly rules: RulesService) {}

  @Get()
  @ApiOkResponse({ type: RuleListDto })
  @ApiProblems(401)
  list(@CurrentPerson() actor: Person): Promise<RuleListDto> {
    return this.rules.list(actor);
  }

  @Get(':id')
  @ApiOkResponse({ type: RuleDto })
  @ApiProblems(401, 404)
  get(@CurrentPerson() actor: Person, @Param('id') id: string): Promise<RuleDto> {
    return this.rules.get(actor, id);
  }
}

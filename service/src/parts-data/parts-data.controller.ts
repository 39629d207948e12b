import { Controller, Get, Query } from '@nestjs/common';
import { ApiBearerAuth, ApiOkResponse, ApiTags } from '@nestjs/swagger';
import { ApiProblems } from '../common/decorators/api-problems.decorator';
import { CurrentPerson } from '../common/decorators/current-person.decorator';
import { Person } from '../people/person.model';
import { PartsQueryDto, PartTypesDto } from './dto/parts-data.dto';
import { PartsDataService } from './parts-data.service';

@ApiTags('parts data')
@ApiBearerAuth()
@Controller('parts-data')
export class PartsDataController {
  constructor(private readonly partsData: PartsDataService) {}

  @Get('tubes')
  @ApiOkResponse({ type: PartTypesDto })
  @ApiProblems(400, 401)
  tubes(@CurrentPerson() actor: Person, @Query() query: PartsQueryDto): Promise<PartTypesDto> {
    return this.partsData.search(actor, 'tube', query);
  }

  @Get('lamps')
  @ApiOkResponse({ type: PartTypesDto })
  @ApiProblems(400, 401)
  lamps(@CurrentPerson() actor: Person, @Query() query: PartsQueryDto): Promise<PartTypesDto> {
    return this.partsData.search(actor, 'lamp', query);
  }
}

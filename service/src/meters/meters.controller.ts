import { Body, Controller, Get, Post } from '@nestjs/common';
import { ApiBearerAuth, ApiCreatedResponse, ApiOkResponse, ApiTags } from '@nestjs/swagger';
import { ApiProblems } from '../common/decorators/api-problems.decorator';
import { CurrentPerson } from '../common/decorators/current-person.decorator';
import { Person } from '../people/person.model';
import { CreateMeterDto, MeterDto } from './dto/meter.dto';
import { MetersService } from './meters.service';

@ApiTags('meters')
@ApiBearerAuth()
@Controller('meters')
export class MetersController {
  constructor(private readonly meters: MetersService) {}

  @Get()
  @ApiOkResponse({ type: [MeterDto] })
  @ApiProblems(401)
  list(@CurrentPerson() actor: Person): Promise<MeterDto[]> {
    return this.meters.list(actor);
  }

  @Post()
  @ApiCreatedResponse({ type: MeterDto })
  @ApiProblems(400, 401, 422)
  create(@CurrentPerson() actor: Person, @Body() body: CreateMeterDto): Promise<MeterDto> {
    return this.meters.create(actor, body);
  }
}

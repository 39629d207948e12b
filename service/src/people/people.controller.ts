import { Body, Controller, Get, Param, ParseIntPipe, Patch, Post } from '@nestjs/common';
import { ApiBearerAuth, ApiCreatedResponse, ApiOkResponse, ApiTags } from '@nestjs/swagger';
import { ApiProblems } from '../common/decorators/api-problems.decorator';
import { CurrentPerson } from '../common/decorators/current-person.decorator';
import { ChangePersonDto } from './dto/change-person.dto';
import { InvitationDto, InviteDto } from './dto/invite.dto';
import { PersonDto } from './dto/person.dto';
import { PeopleService } from './people.service';
import { Person } from './person.model';

@ApiTags('people')
@ApiBearerAuth()
@Controller('people')
export class PeopleController {
  constructor(private readonly people: PeopleService) {}

  @Get()
  @ApiOkResponse({ type: [PersonDto] })
  @ApiProblems(401, 403)
  list(@CurrentPerson() actor: Person): Promise<PersonDto[]> {
    return this.people.list(actor);
  }

  @Post('invitations')
  @ApiCreatedResponse({ type: InvitationDto })
  @ApiProblems(400, 401, 403, 422)
  invite(@CurrentPerson() actor: Person, @Body() body: InviteDto): Promise<InvitationDto> {
    return this.people.invite(actor, body);
  }

  @Patch(':id')
  @ApiOkResponse({ type: PersonDto })
  @ApiProblems(400, 401, 403, 404, 409)
  change(
    @CurrentPerson() actor: Person,
    @Param('id', ParseIntPipe) id: number,
    @Body() body: ChangePersonDto,
  ): Promise<PersonDto> {
    return this.people.change(actor, id, body);
  }
}

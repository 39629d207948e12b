import {
  Body,
  Controller,
  Delete,
  Get,
  HttpCode,
  Param,
  ParseIntPipe,
  Post,
  Query,
} from '@nestjs/common';
import {
  ApiBearerAuth,
  ApiCreatedResponse,
  ApiNoContentResponse,
  ApiOkResponse,
  ApiQuery,
  ApiTags,
} from '@nestjs/swagger';
import { ApiProblems } from '../common/decorators/api-problems.decorator';
import { CurrentPerson } from '../common/decorators/current-person.decorator';
import { Person } from '../people/person.model';
import { CaseReadingDto, EnterReadingsDto } from './dto/reading.dto';
import { ReadingsService } from './readings.service';

@ApiTags('readings')
@ApiBearerAuth()
@Controller('cases/:id/readings')
export class ReadingsController {
  constructor(private readonly readings: ReadingsService) {}

  @Get()
  @ApiQuery({
    name: 'history',
    required: false,
    description: '1 for replaced and withdrawn readings too.',
  })
  @ApiOkResponse({ type: [CaseReadingDto] })
  @ApiProblems(401, 404)
  list(
    @CurrentPerson() actor: Person,
    @Param('id', ParseIntPipe) id: number,
    @Query('history') history?: string,
  ): Promise<CaseReadingDto[]> {
    return this.readings.list(actor, id, history === '1' || history === 'true');
  }

  @Get('history')
  @ApiQuery({ name: 'place', required: true, description: 'Take and place, such as “ohms R1B”.' })
  @ApiOkResponse({ type: [CaseReadingDto] })
  @ApiProblems(401, 404)
  history(
    @CurrentPerson() actor: Person,
    @Param('id', ParseIntPipe) id: number,
    @Query('place') place: string,
  ): Promise<CaseReadingDto[]> {
    return this.readings.list(actor, id, true, String(place ?? ''));
  }

  @Post()
  @ApiCreatedResponse({ type: [CaseReadingDto] })
  @ApiProblems(400, 401, 403, 404, 409, 422)
  enter(
    @CurrentPerson() actor: Person,
    @Param('id', ParseIntPipe) id: number,
    @Body() body: EnterReadingsDto,
  ): Promise<CaseReadingDto[]> {
    return this.readings.enter(actor, id, body);
  }

  @Delete(':readingId')
  @HttpCode(204)
  @ApiNoContentResponse()
  @ApiProblems(401, 403, 404)
  withdraw(
    @CurrentPerson() actor: Person,
    @Param('id', ParseIntPipe) id: number,
    @Param('readingId', ParseIntPipe) readingId: number,
  ): Promise<void> {
    return this.readings.withdraw(actor, id, readingId);
  }
}

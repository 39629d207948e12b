import { Controller, Get } from '@nestjs/common';
import { ApiOkResponse, ApiProperty, ApiTags } from '@nestjs/swagger';
import { Public } from '../common/decorators/public.decorator';
import { ProblemException } from '../common/problem';
import { DatabaseService } from '../database/database.service';

export class HealthDto {
  @ApiProperty({ example: 'ok' }) status: string;
}

@ApiTags('health')
@Public()
@Controller()
export class HealthController {
  constructor(private readonly database: DatabaseService) {}

  /** The process answers. */
  @Get('health')
  @ApiOkResponse({ type: HealthDto })
  health(): HealthDto {
    return { status: 'ok' };
  }

  /** The database answers too. */
  @Get('ready')
  @ApiOkResponse({ type: HealthDto })
  async ready(): Promise<HealthDto> {
    try {
      await this.database.sequelize.query('SELECT 1');
    } catch {
      throw new ProblemException(503, 'not-ready', 'The database does not answer.');
    }
    return { status: 'ok' };
  }
}

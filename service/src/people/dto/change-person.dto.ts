import { ApiPropertyOptional } from '@nestjs/swagger';
import { IsBoolean, IsIn, IsOptional } from 'class-validator';
import { type Role, ROLES } from '../../common/policy';

export class ChangePersonDto {
  @ApiPropertyOptional({ enum: ROLES, enumName: 'Role' })
  @IsOptional()
  @IsIn(ROLES, { message: 'Choose a role: trainee, technician, senior or owner.' })
  role?: Role;

  @ApiPropertyOptional()
  @IsOptional()
  @IsBoolean({ message: 'Blocked is yes or no.' })
  isBlocked?: boolean;
}

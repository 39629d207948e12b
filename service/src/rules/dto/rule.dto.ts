import { ApiProperty, ApiPropertyOptional } from '@nestjs/swagger';
import type { Rule } from '../../engine';
import type { RuleRow } from '../rule.model';

export class RuleSourceDto {
  @ApiProperty() title: string;
  @ApiProperty({ enum: ['confirmed', 'from memory', 'common practice'] }) status: string;
}

export class RuleSummaryDto {
  @ApiProperty({ description: 'The rule’s own id.' }) id: string;
  @ApiProperty() pack: string;
  @ApiProperty() name: string;
  @ApiProperty({ description: 'The rule said as a sentence.' }) sentence: string;
  @ApiProperty({
    type: [String],
    enum: ['speaks-for', 'speaks-against', 'cause', 'advice', 'caution'],
  })
  effects: string[];
  @ApiProperty() because: string;
  @ApiPropertyOptional({ type: RuleSourceDto }) source?: RuleSourceDto;
  @ApiProperty() version: number;
  @ApiProperty({ enum: ['active', 'superseded', 'retired'] }) state: string;
  @ApiProperty({ format: 'date-time' }) since: string;
}

export class RuleVersionDto {
  @ApiProperty() version: number;
  @ApiProperty({ format: 'date-time' }) at: string;
  @ApiProperty() state: string;
}

export class RuleDto extends RuleSummaryDto {
  @ApiProperty({ type: 'object', additionalProperties: true }) content: Rule;
  @ApiProperty({ type: [RuleVersionDto] }) versions: RuleVersionDto[];
}

export class RefusedRuleDto {
  @ApiProperty() file: string;
  @ApiProperty() reason: string;
}

export class RuleListDto {
  @ApiProperty({ type: [RuleSummaryDto] }) rules: RuleSummaryDto[];
  @ApiProperty({ type: [RefusedRuleDto], description: 'Files that could not be used.' })
  refused: RefusedRuleDto[];
}

/** A rule as it stands in lists. */
export function presentRule({ content, pack, version, state, createdAt }: RuleRow): RuleSummaryDto {
  const { id, name, sentence, then, because, source } = content;
  return {
    id,
    pack,
    name,
    sentence,
    effects: [...new Set(then.map(({ effect }) => effect))],
    because,
    ...(source ? { source } : {}),
    version,
    state,
    since: createdAt.toISOString(),
  };
}

import type { CaseDto } from '../../src/cases/dto/case.dto';
import type { Role } from '../../src/common/policy';
import type { TestApp } from '../test-app';
import { buildNetlist } from './netlist.factory';

/** Opens a case through the API on a netlist of its own. */
export async function openCase(
  app: TestApp,
  overrides: object = {},
  role: Role = 'technician',
): Promise<CaseDto> {
  const { body, status } = await app.send(role, 'post', '/cases', {
    set: 'Test receiver',
    complaint: 'Dead.',
    netlist: buildNetlist(),
    lineVolts: 117,
    ...overrides,
  });
  if (status !== 201) throw new Error(`The case was not opened: ${JSON.stringify(body)}`);
  return body as CaseDto;
}

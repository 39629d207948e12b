import { type AsFound, type FaultMode, type Netlist } from '@engine/netlist/types';
import { type components } from './api-types';

type Schemas = components['schemas'];

/** What a person may do in the shop, from least to most. */
export const ROLES = ['trainee', 'technician', 'senior', 'owner'] as const satisfies Role[];
export type Role = Schemas['Role'];

export type Person = Schemas['PersonDto'];
export type SignedIn = Schemas['SignedInDto'];

export type Outcome = Schemas['Outcome'];
export interface ConfirmedFault {
  part: string;
  mode: FaultMode;
}

export type CaseSummary = Schemas['CaseSummaryDto'];
/** The circuit's own types are the engine's; the API's description calls it an object. */
export type Case = Omit<Schemas['CaseDto'], 'netlist' | 'asFound'> & {
  netlist: Netlist;
  asFound: AsFound[];
};

export type FamilySummary = Schemas['FamilySummaryDto'];
export type Family = Omit<Schemas['FamilyDto'], 'netlist'> & { netlist: Netlist };

export type RuleSummary = Schemas['RuleSummaryDto'];
export type RuleList = Schemas['RuleListDto'];

export type PartFact = Schemas['PartTypeDto'];

export interface Page<Item> {
  total: number;
  items: Item[];
}

import { type CaseSummary } from '@/lib/api-model';

/** A case's number as it is written on its bench card: "No. 12". */
export function caseNumber({ number }: Pick<CaseSummary, 'number'>): string {
  return typeof number === 'number' || /^\d+$/.test(number) ? `No. ${number}` : number;
}

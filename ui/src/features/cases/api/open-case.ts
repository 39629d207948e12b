import { useMutation, useQueryClient } from '@tanstack/react-query';
import { type Line, type Netlist } from '@engine/netlist/types';
import * as z from 'zod/mini';
import { apiClient } from '@/lib/api-client';
import { type Case } from '@/lib/api-model';
import { readQuantity } from '@/components/QuantityInput';

/** Where the circuit of a new case comes from. */
export const CIRCUIT_SOURCES = ['family', 'json', 'csv'] as const;

/** What the form for a new case holds. */
export const openCaseSchema = z
  .object({
    set: z
      .string()
      .check(z.trim(), z.minLength(1, 'Say which set is on the bench.'), z.maxLength(200)),
    complaint: z
      .string()
      .check(
        z.trim(),
        z.minLength(1, 'Say what is wrong with it, in a sentence.'),
        z.maxLength(2000),
      ),
    source: z.enum(CIRCUIT_SOURCES),
    familyId: z.string(),
    netlistText: z.string(),
    csv: z.string(),
    reference: z.string(),
    hot: z.string(),
    return: z.string(),
    designVolts: z.string(),
    hertz: z.string(),
    lineVolts: z.string(),
  })
  .check((context) => {
    const form = context.value;
    const refuse = (field: keyof typeof form, message: string) =>
      context.issues.push({ code: 'custom', path: [field], message, input: form[field] });
    if (form.source === 'family' && !form.familyId) refuse('familyId', 'Choose a family.');
    if (form.source === 'json') {
      const read = readDocument(form.netlistText);
      if (!read.ok) refuse('netlistText', read.message);
    }
    if (form.source === 'csv') {
      if (!form.csv.trim()) refuse('csv', 'Paste the table of parts, or choose a file.');
      if (!form.reference.trim())
        refuse('reference', 'Name the node that readings are taken against.');
      const design = readQuantity(form.designVolts, 'V');
      if (!design.ok) refuse('designVolts', design.message);
      const hertz = readQuantity(form.hertz, 'Hz');
      if (!hertz.ok) refuse('hertz', hertz.message);
      if (form.hot.trim() && !form.return.trim())
        refuse('return', 'Name the node that the line returns to.');
    }
    const volts = readQuantity(form.lineVolts, 'V');
    if (!volts.ok) refuse('lineVolts', volts.message);
  });
export type OpenCaseForm = z.infer<typeof openCaseSchema>;

/**
 * Reads a pasted netlist as far as its syntax goes; what it means is checked by the service.
 *
 * @param text what was pasted.
 * @returns the document, or a sentence that says what is wrong.
 */
export function readDocument(
  text: string,
): { ok: true; netlist: Netlist } | { ok: false; message: string } {
  if (!text.trim()) return { ok: false, message: 'Paste the netlist, or choose a file.' };
  try {
    const document: unknown = JSON.parse(text);
    if (typeof document === 'object' && document !== null && !Array.isArray(document))
      return { ok: true, netlist: document as Netlist };
  } catch (error) {
    return {
      ok: false,
      message: `This is not readable as JSON. ${(error as Error).message}.`.replace('..', '.'),
    };
  }
  return { ok: false, message: 'A netlist is one JSON object, from { to }.' };
}

async function circuitOf(form: OpenCaseForm): Promise<{ familyId?: number; netlist?: Netlist }> {
  if (form.source === 'family') return { familyId: Number(form.familyId) };
  if (form.source === 'json') {
    const read = readDocument(form.netlistText);
    return read.ok ? { netlist: read.netlist } : {};
  }
  const { data } = await apiClient.post<{ netlist: Netlist }>('/circuits/import-csv', {
    csv: form.csv,
    title: form.set,
    reference: form.reference.trim(),
    line: lineOf(form),
  });
  return { netlist: data.netlist };
}

function lineOf(form: OpenCaseForm): Line | undefined {
  const volts = readQuantity(form.designVolts, 'V');
  const hertz = readQuantity(form.hertz, 'Hz');
  if (!form.hot.trim() || !volts.ok || !volts.value || !hertz.ok || !hertz.value) return undefined;
  return {
    hot: form.hot.trim(),
    return: form.return.trim(),
    volts: volts.value,
    hertz: hertz.value,
  };
}

/** Opens a case; a pasted table of parts is turned into a circuit first. */
export function useOpenCase() {
  const client = useQueryClient();
  return useMutation({
    mutationFn: async (form: OpenCaseForm) => {
      const volts = readQuantity(form.lineVolts, 'V');
      const { data } = await apiClient.post<Case>('/cases', {
        set: form.set,
        complaint: form.complaint,
        lineVolts: volts.ok ? volts.value : undefined,
        ...(await circuitOf(form)),
      });
      return data;
    },
    onSuccess: () => client.invalidateQueries({ queryKey: ['cases', 'list'] }),
  });
}

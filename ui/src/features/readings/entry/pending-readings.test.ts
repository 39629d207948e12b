import { beforeEach, describe, expect, it } from 'vitest';
import { type PendingReading, usePendingReadings } from './pending-readings';

const store = usePendingReadings;
const reading = (clientId: string, part: string, value: number): PendingReading => ({
  clientId,
  place: { take: 'ohms', part },
  value,
});

beforeEach(() => {
  store.setState({ pending: {}, drafts: {} });
});

describe('readings on their way', () => {
  it('stand in the browser until they are settled, so that a reload keeps them', async () => {
    store.getState().keep('c1', [reading('a', 'R1A', 22)]);
    store.getState().setDraft('c1', 'ohms part R1B', '15.');
    const stored = localStorage.getItem('ohmstead.readings');
    store.setState({ pending: {}, drafts: {} });
    localStorage.setItem('ohmstead.readings', stored!);
    await store.persist.rehydrate();
    expect(store.getState().pending.c1).toEqual([reading('a', 'R1A', 22)]);
    expect(store.getState().drafts.c1).toEqual({ 'ohms part R1B': '15.' });
  });

  it('hold one reading per place, the newest', () => {
    store.getState().keep('c1', [reading('a', 'R1A', 22), reading('b', 'R1B', 15)]);
    store.getState().keep('c1', [reading('c', 'R1A', 23)]);
    expect(store.getState().pending.c1.map(({ clientId }) => clientId)).toEqual(['b', 'c']);
  });

  it('leave nothing behind when all are settled', () => {
    store.getState().keep('c1', [reading('a', 'R1A', 22)]);
    store.getState().settle('c1', ['a']);
    expect(store.getState().pending).toEqual({});
  });

  it('keep a refused one with its sentence', () => {
    store.getState().keep('c1', [reading('a', 'R1A', 22)]);
    store.getState().refuse('c1', 'a', 'This part is not in the circuit.');
    expect(store.getState().pending.c1[0].refusal).toBe('This part is not in the circuit.');
  });
});

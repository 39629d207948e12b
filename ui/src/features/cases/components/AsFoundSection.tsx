import { type AsFound } from '@engine/netlist/types';
import { Button, makeStyles, Text, tokens } from '@fluentui/react-components';
import { useState } from 'react';
import { FormMessage } from '@/components/FormMessage';
import { type Case } from '@/lib/api-model';
import { problemInWords } from '@/lib/bench/problem';
import { useUpdateCase } from '../api/update-case';
import { asFoundInWords } from '../words/as-found-words';
import { AddDifferenceForm } from './AddDifferenceForm';

const useStyles = makeStyles({
  root: { display: 'flex', flexDirection: 'column', gap: tokens.spacingVerticalM },
  title: { margin: 0, fontSize: tokens.fontSizeBase500, lineHeight: tokens.lineHeightBase500 },
  list: { margin: 0, padding: 0, listStyle: 'none' },
  item: {
    display: 'flex',
    alignItems: 'center',
    justifyContent: 'space-between',
    gap: tokens.spacingHorizontalM,
    minHeight: '48px',
    borderBottom: `1px solid ${tokens.colorNeutralStroke3}`,
  },
  add: { alignSelf: 'flex-start' },
});

/** How this set differs from its drawing, in words, with a form to add to it. */
export function AsFoundSection({ repair }: { repair: Case }) {
  const styles = useStyles();
  const [isAdding, setIsAdding] = useState(false);
  const update = useUpdateCase(String(repair.id));
  const { asFound, netlist, version, abilities } = repair;
  const save = (next: AsFound[]) =>
    update.mutate({ asFound: next, version }, { onSuccess: () => setIsAdding(false) });
  return (
    <section className={styles.root} aria-labelledby="as-found">
      <h2 id="as-found" className={styles.title}>
        As found
      </h2>
      {asFound.length === 0 ? (
        <Text>
          Nothing is recorded yet. When something in this set is not as it is drawn, say so here:
          the computed values follow it.
        </Text>
      ) : (
        <ul className={styles.list}>
          {asFound.map((entry, index) => {
            const words = asFoundInWords(entry, netlist.parts);
            return (
              <li key={words} className={styles.item}>
                <Text>{words}</Text>
                {abilities.edit && (
                  <Button
                    appearance="subtle"
                    aria-label={`Remove: ${words}`}
                    disabled={update.isPending}
                    onClick={() => save(asFound.filter((_one, at) => at !== index))}
                  >
                    Remove
                  </Button>
                )}
              </li>
            );
          })}
        </ul>
      )}
      <FormMessage message={update.isError ? problemInWords(update.error) : undefined} />
      {abilities.edit &&
        (isAdding ? (
          <AddDifferenceForm
            netlist={netlist}
            isSaving={update.isPending}
            onAdd={(entry) => save([...asFound, entry])}
            onCancel={() => setIsAdding(false)}
          />
        ) : (
          <Button size="large" className={styles.add} onClick={() => setIsAdding(true)}>
            Add a difference
          </Button>
        ))}
    </section>
  );
}

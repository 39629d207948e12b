import { Field, makeStyles, SearchBox, Text, tokens } from '@fluentui/react-components';
import { useMemo, useState } from 'react';
import { paths } from '@/app/paths';
import { EmptyState } from '@/components/EmptyState';
import { FailedState } from '@/components/FailedState';
import { LoadingState } from '@/components/LoadingState';
import { PageHeader } from '@/components/PageHeader';
import { usePageStyles } from '@/components/page-styles';
import { useRules } from '@/features/rules/api/get-rules';
import { RuleCard } from '@/features/rules/components/RuleCard';
import { type RuleSummary } from '@/lib/api-model';

const useStyles = makeStyles({
  search: { width: 'min(100%, 420px)', marginBottom: tokens.spacingVerticalXL },
  box: { width: '100%', maxWidth: 'none' },
  pack: {
    margin: `${tokens.spacingVerticalXXL} 0 ${tokens.spacingVerticalM}`,
    fontSize: tokens.fontSizeBase500,
    lineHeight: tokens.lineHeightBase500,
  },
  list: {
    display: 'flex',
    flexDirection: 'column',
    gap: tokens.spacingVerticalM,
    margin: 0,
    padding: 0,
    listStyle: 'none',
  },
  refused: { overflowWrap: 'anywhere', marginBottom: tokens.spacingVerticalS },
});

/** What the shop's technicians know, as rules in sentences. */
export function Component() {
  const styles = useStyles();
  const page = usePageStyles();
  const rules = useRules();
  const [search, setSearch] = useState('');
  const packs = useMemo(() => byPack(rules.data?.rules ?? [], search), [rules.data, search]);
  return (
    <div className={page.text}>
      <PageHeader
        title="Rules"
        hint="What technicians know beside the circuit. Each rule says why, and speaks only when its readings are there."
      />
      {rules.isPending ? (
        <LoadingState label="Fetching the rules" />
      ) : rules.isLoadingError ? (
        <FailedState error={rules.error} onRetry={() => void rules.refetch()} />
      ) : (
        <>
          {rules.data.refused.length > 0 && (
            <section aria-labelledby="refused">
              <h2 id="refused" className={styles.pack}>
                Refused files
              </h2>
              <ul>
                {rules.data.refused.map(({ file, reason }) => (
                  <li key={file} className={styles.refused}>
                    <strong>{file}</strong> {reason}
                  </li>
                ))}
              </ul>
            </section>
          )}
          {rules.data.rules.length === 0 ? (
            <EmptyState title="There are no rules yet.">
              Put rule files into the folder “rules”; suspects are ranked from the circuit alone
              until then.
            </EmptyState>
          ) : (
            <>
              <Field label="Search" className={styles.search}>
                <SearchBox
                  className={styles.box}
                  size="large"
                  value={search}
                  onChange={(_event, { value }) => setSearch(value)}
                />
              </Field>
              {packs.length === 0 && <Text role="status">No rule says that.</Text>}
              {packs.map(([pack, members]) => (
                <section key={pack} aria-label={pack}>
                  <h2 className={styles.pack}>{packInWords(pack)}</h2>
                  <ul className={styles.list}>
                    {members.map((rule) => (
                      <RuleCard key={rule.id} rule={rule} to={paths.rule(rule.id)} />
                    ))}
                  </ul>
                </section>
              ))}
            </>
          )}
        </>
      )}
    </div>
  );
}

function byPack(rules: readonly RuleSummary[], search: string): [string, RuleSummary[]][] {
  const wanted = search.trim().toLowerCase();
  const packs = new Map<string, RuleSummary[]>();
  for (const rule of rules) {
    const text = `${rule.name} ${rule.sentence} ${rule.because}`.toLowerCase();
    if (wanted && !text.includes(wanted)) continue;
    packs.set(rule.pack, [...(packs.get(rule.pack) ?? []), rule]);
  }
  return [...packs];
}

function packInWords(pack: string): string {
  const words = pack.replaceAll('-plus', '+').replaceAll('-', ' ');
  return words.charAt(0).toUpperCase() + words.slice(1);
}

import { makeStyles, Text, tokens } from '@fluentui/react-components';
import { type ReactNode } from 'react';
import { dayInWords } from '@/lib/words';
import { type Rule } from '../api/get-rule';
import { type ConditionList, conditionsInWords, effectInWords } from '../words/rule-words';

const useStyles = makeStyles({
  root: { display: 'flex', flexDirection: 'column', gap: tokens.spacingVerticalXXL },
  title: {
    margin: `0 0 ${tokens.spacingVerticalS}`,
    fontSize: tokens.fontSizeBase500,
    lineHeight: tokens.lineHeightBase500,
  },
  text: { display: 'block', maxWidth: '68ch' },
  list: {
    display: 'flex',
    flexDirection: 'column',
    gap: tokens.spacingVerticalXS,
    maxWidth: '68ch',
    margin: `${tokens.spacingVerticalXS} 0 0`,
    paddingLeft: '20px',
  },
  quiet: { color: tokens.colorNeutralForeground3 },
});

/** A rule in full: what it looks at, what it does, why, who says so and since when. */
export function RuleSheet({ rule }: { rule: Rule }) {
  const styles = useStyles();
  const { content, because, source, versions } = rule;
  return (
    <div className={styles.root}>
      <Section title="When it speaks">
        <Conditions list={conditionsInWords(content.when)} />
      </Section>
      <Section title="What it says">
        <ul className={styles.list}>
          {content.then.map((effect, index) => {
            const { sentence, members } = effectInWords(effect);
            return (
              <li key={index}>
                {sentence}
                {members.length > 0 && (
                  <ul className={styles.list}>
                    {members.map((member) => (
                      <li key={member}>{member}</li>
                    ))}
                  </ul>
                )}
              </li>
            );
          })}
        </ul>
      </Section>
      <Section title="Why">
        <Text className={styles.text}>{because}</Text>
        <Text className={styles.quiet}>
          {source ? `Source: ${source.title} (${source.status}).` : 'No source is given.'}
        </Text>
      </Section>
      <Section title="Versions">
        <ul className={styles.list}>
          {versions.map(({ version, at, state }) => (
            <li key={version}>
              Version {version}, {dayInWords(at)}, {state}
            </li>
          ))}
        </ul>
      </Section>
    </div>
  );
}

function Section({ title, children }: { title: string; children: ReactNode }) {
  const styles = useStyles();
  return (
    <section aria-label={title}>
      <h2 className={styles.title}>{title}</h2>
      {children}
    </section>
  );
}

function Conditions({ list }: { list: ConditionList }) {
  const styles = useStyles();
  return (
    <>
      <Text>{list.lead}</Text>
      <ul className={styles.list}>
        {list.items.map((item) =>
          typeof item === 'string' ? (
            <li key={item}>{item}</li>
          ) : (
            <li key={JSON.stringify(item)}>
              <Conditions list={item} />
            </li>
          ),
        )}
      </ul>
    </>
  );
}

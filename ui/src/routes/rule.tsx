import { makeStyles, tokens } from '@fluentui/react-components';
import { Link, useParams } from 'react-router-dom';
import { paths } from '@/app/paths';
import { FailedState } from '@/components/FailedState';
import { LoadingState } from '@/components/LoadingState';
import { PageHeader } from '@/components/PageHeader';
import { usePageStyles } from '@/components/page-styles';
import { useRule } from '@/features/rules/api/get-rule';
import { RuleSheet } from '@/features/rules/components/RuleSheet';

const useStyles = makeStyles({
  back: {
    display: 'inline-flex',
    alignItems: 'center',
    minHeight: '44px',
    color: tokens.colorBrandForegroundLink,
  },
});

/** One rule in full. */
export function Component() {
  const styles = useStyles();
  const page = usePageStyles();
  const { ruleId = '' } = useParams();
  const rule = useRule(ruleId);
  return (
    <div className={page.text}>
      <Link to={paths.rules} className={styles.back}>
        All rules
      </Link>
      {rule.isPending ? (
        <LoadingState label="Fetching the rule" />
      ) : rule.isLoadingError ? (
        <FailedState error={rule.error} onRetry={() => void rule.refetch()} />
      ) : (
        <>
          <PageHeader title={rule.data.name} hint={rule.data.sentence} />
          <RuleSheet rule={rule.data} />
        </>
      )}
    </div>
  );
}

import {
  Button,
  makeStyles,
  MessageBar,
  MessageBarActions,
  MessageBarBody,
  MessageBarTitle,
} from '@fluentui/react-components';

const useStyles = makeStyles({
  button: { '@media (pointer: coarse)': { minHeight: '44px' } },
});

/** Stands in front of the powered readings until the cautions were acknowledged. */
export function CautionNote({ onNeedCautions }: { onNeedCautions: () => void }) {
  const styles = useStyles();
  return (
    <MessageBar intent="warning" layout="multiline">
      <MessageBarBody>
        <MessageBarTitle>Before power</MessageBarTitle>
        Take the cold readings first. Powered readings can be entered once you have read the
        cautions for this set.
      </MessageBarBody>
      <MessageBarActions>
        <Button className={styles.button} onClick={onNeedCautions}>
          Read the cautions
        </Button>
      </MessageBarActions>
    </MessageBar>
  );
}

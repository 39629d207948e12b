import { type DiagnosisResult } from '@engine/diagnosis-types';
import { type Netlist } from '@engine/netlist/types';
import {
  Button,
  makeStyles,
  MessageBar,
  MessageBarActions,
  MessageBarBody,
  MessageBarTitle,
  tokens,
} from '@fluentui/react-components';
import { LightbulbRegular } from '@fluentui/react-icons';
import { type CaseReading } from '@/lib/bench/case-reading';
import { labelForReading, type Place, placeOf } from '@/lib/bench/places';
import { readingInWords } from '@/lib/bench/quantities';

interface DiagnosisRemarksProps {
  result: DiagnosisResult;
  readings: readonly (CaseReading | undefined)[];
  netlist: Netlist;
  onEnterReading?: (place: Place) => void;
}

const useStyles = makeStyles({
  root: { display: 'flex', flexDirection: 'column', gap: tokens.spacingVerticalS },
  summary: { cursor: 'pointer', fontWeight: tokens.fontWeightSemibold },
  list: { margin: `${tokens.spacingVerticalXS} 0 0`, paddingLeft: tokens.spacingHorizontalL },
  button: { '@media (pointer: coarse)': { minHeight: '44px' } },
});

/** What comes before the suspects: cautions, "none of these", readings to take again. */
export function DiagnosisRemarks(props: DiagnosisRemarksProps) {
  const { result, readings, netlist, onEnterReading } = props;
  const styles = useStyles();
  const again = result.retake.flatMap((index) => readings[index] ?? []);
  const cautions = result.advice.filter(({ effect }) => effect === 'caution');
  const bars = [
    cautions.length > 0 && (
      <MessageBar key="cautions" intent="warning" layout="multiline">
        <MessageBarBody>
          <details>
            <summary className={styles.summary}>
              {cautions.length === 1 ? 'A caution applies' : `${cautions.length} cautions apply`} to
              this set.
            </summary>
            <ul className={styles.list}>
              {cautions.map(({ rule, text, because }) => (
                <li key={rule}>
                  {text} {because}
                </li>
              ))}
            </ul>
          </details>
        </MessageBarBody>
      </MessageBar>
    ),
    result.noneOfThese && (
      <MessageBar key="none" intent="warning" layout="multiline">
        <MessageBarBody>
          <MessageBarTitle>Perhaps none of these</MessageBarTitle>
          Even the best suspect explains the readings badly. Check the readings marked below, and
          whether the set differs from its drawing.
        </MessageBarBody>
      </MessageBar>
    ),
    ...again.map((reading) => (
      <MessageBar key={reading.id} intent="info" layout="multiline">
        <MessageBarBody>
          <MessageBarTitle>Take this one again</MessageBarTitle>
          {capital(labelForReading(netlist, reading))} gave {readingInWords(reading)}, which fits
          none of the good suspects.
        </MessageBarBody>
        {onEnterReading && (
          <MessageBarActions>
            <Button
              size="small"
              className={styles.button}
              onClick={() => onEnterReading(placeOf(reading))}
            >
              Enter it again
            </Button>
          </MessageBarActions>
        )}
      </MessageBar>
    )),
  ].filter(Boolean);
  return bars.length > 0 ? <div className={styles.root}>{bars}</div> : null;
}

/** What follows the suspects: remarks on the whole and the advice of rules. */
export function DiagnosisAdvice({ result }: Pick<DiagnosisRemarksProps, 'result'>) {
  const styles = useStyles();
  const advice = result.advice.filter(({ effect }) => effect === 'advice');
  if (advice.length === 0 && result.remarks.length === 0) return null;
  return (
    <div className={styles.root}>
      {advice.map(({ rule, text, because }) => (
        <MessageBar key={rule} intent="info" layout="multiline" icon={<LightbulbRegular />}>
          <MessageBarBody>
            <MessageBarTitle>Advice</MessageBarTitle>
            {text} {because}
          </MessageBarBody>
        </MessageBar>
      ))}
      {result.remarks.map((remark) => (
        <MessageBar key={remark} intent="info" layout="multiline">
          <MessageBarBody>{remark}</MessageBarBody>
        </MessageBar>
      ))}
    </div>
  );
}

function capital(text: string): string {
  return text[0].toUpperCase() + text.slice(1);
}

import { Button, makeStyles, tokens } from '@fluentui/react-components';
import { FullScreenMaximizeRegular, ZoomInRegular, ZoomOutRegular } from '@fluentui/react-icons';

interface ZoomControlsProps {
  onZoomIn: () => void;
  onZoomOut: () => void;
  onFit: () => void;
}

const useStyles = makeStyles({
  root: {
    display: 'flex',
    flexShrink: 0,
    alignSelf: 'flex-end',
    padding: tokens.spacingVerticalXXS,
    '@media (pointer: coarse)': { '& button': { minWidth: '44px', minHeight: '44px' } },
  },
});

/** Zoom in, zoom out, and the whole circuit. */
export function ZoomControls({ onZoomIn, onZoomOut, onFit }: ZoomControlsProps) {
  const styles = useStyles();
  const look = { appearance: 'subtle', size: 'small' } as const;
  return (
    <div className={styles.root} role="group" aria-label="View">
      <Button {...look} icon={<ZoomOutRegular />} aria-label="Zoom out" onClick={onZoomOut} />
      <Button {...look} icon={<ZoomInRegular />} aria-label="Zoom in" onClick={onZoomIn} />
      <Button
        {...look}
        icon={<FullScreenMaximizeRegular />}
        aria-label="Show the whole circuit"
        onClick={onFit}
      />
    </div>
  );
}

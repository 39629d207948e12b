import { type BrandVariants } from '@fluentui/react-components';

/** The accent: verdigris, the green that old copper takes on. 10 is darkest. */
export const verdigris: BrandVariants = {
  10: '#04110e',
  20: '#0a211c',
  30: '#0f312a',
  40: '#134138',
  50: '#175246',
  60: '#1a5c4f',
  70: '#1d6558',
  80: '#227264',
  90: '#338474',
  100: '#479685',
  110: '#5ca796',
  120: '#73b7a7',
  130: '#8cc6b8',
  140: '#a7d5ca',
  150: '#c4e4dc',
  160: '#e3f3ef',
};

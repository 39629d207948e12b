/** Values as people write and read them; SI numbers inside. Pure: the ui imports it as well. */
export { formatQuantity } from './units/format';
export { type ParsedQuantity, parseQuantity, parseRating } from './units/parse';
export type { Unit } from './units/unit-words';

/** A practice label as the reader sees it: a black-ruled panel of headed lines. */
export interface LabelView {
  key: string;
  name: string;
  /** "Herbicide", "Insecticide" ... */
  type: string;
  /** "Practice no. 000-14": invented, and said to be so. */
  number: string;
  /** "Practice label. Not a real product." */
  notice: string;
  rows: readonly { heading: string; text: string }[];
}

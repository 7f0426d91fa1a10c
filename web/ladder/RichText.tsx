import { type Manner, type Run, richText } from '../../core/sheet/richText.ts';

interface Props {
  readonly text: string;
  readonly manner?: Manner;
}

const set = ({ text, italic, sub, sup }: Run) => {
  const inner = italic ? <i class="symbol">{text}</i> : text;
  if (sub) return <sub>{inner}</sub>;
  return sup ? <sup>{inner}</sup> : inner;
};

/** A line of symbols with italics, subscripts and exponents in place. */
export const RichText = ({ text, manner = 'prose' }: Props) => <>{richText(text, manner).map(set)}</>;

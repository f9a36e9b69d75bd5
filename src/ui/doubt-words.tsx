type DoubtWordsProps = { isInDoubt: boolean; isLeftOut: boolean };

/** Beside a figure: a data check doubts it, or a physicist left it out. In words, so that no colour has to say it. */
export function DoubtWords({ isInDoubt, isLeftOut }: DoubtWordsProps) {
  if (!isInDoubt && !isLeftOut) return null;
  return (
    <span className="block text-xs font-normal text-ink-2">
      {isInDoubt ? 'value in doubt' : 'left out of statistics'}
    </span>
  );
}

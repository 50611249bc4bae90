/** The words by which a script makes code or markup out of texts. */
export const dynamicWords = {
  eval: /\beval\)?\s*\(/g,
  Function: /\bFunction\s*\((?!\))/g,
  "timer of a text": /\bset(?:Timeout|Interval)\s*\(\s*["'`]/g,
  "innerHTML =": /\.innerHTML\s*=(?!=)/g,
  "outerHTML =": /\.outerHTML\s*=(?!=)/g,
  insertAdjacentHTML: /\binsertAdjacentHTML\b/g,
  "document.write": /\bdocument\.write(?:ln)?\b/g,
  createContextualFragment: /\bcreateContextualFragment\b/g,
  "parsing as text/html": /\bparseFromString\s*\([^)]*text\/html/g,
  "setHTML, parseHTML": /\bsetHTML\w*|\bparseHTML\w*/g,
  srcdoc: /\bsrcdoc\b/gi,
  "javascript:": /javascript:/gi,
  Worker: /\bnew (?:Shared)?Worker\s*\(/g,
  dangerouslySetInnerHTML: /\bdangerouslySetInnerHTML\b/g,
} as const;

export type DynamicWord = keyof typeof dynamicWords;

/** How often each word stands in a script; those that stand nowhere are left out. */
export const countDynamicWords = (script: string): Partial<Record<DynamicWord, number>> =>
  Object.fromEntries(
    Object.entries(dynamicWords)
      .map(([word, pattern]) => [word, script.match(pattern)?.length ?? 0] as const)
      .filter(([, count]) => count > 0),
  );

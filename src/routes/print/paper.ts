import { useEffect } from 'react';
import { useSearchParams } from 'react-router-dom';
import { useUnits } from '../../app/useUnits.ts';

/** Papers that a page may be printed on, as CSS writes their sizes. */
export const PAPERS = {
  a4: { name: 'A4', width: '210mm', height: '297mm' },
  letter: { name: 'Letter', width: '8.5in', height: '11in' },
} as const;
export type PaperName = keyof typeof PAPERS;

const isPaper = (name: string | null): name is PaperName => name !== null && name in PAPERS;

/** The chosen paper stands in the address; whoever measures in US units has Letter at hand. */
export function usePaper(): readonly [PaperName, (name: PaperName) => void] {
  const [params, setParams] = useSearchParams();
  const { system } = useUnits();
  const asked = params.get('paper');
  const paper = isPaper(asked) ? asked : system === 'us' ? 'letter' : 'a4';
  const choose = (name: PaperName) =>
    setParams(
      (before) => {
        before.set('paper', name);
        return before;
      },
      { replace: true },
    );
  return [paper, choose];
}

/** A CSS string; what would end it is written by its number. */
const quoted = (text: string): string =>
  `"${text.replace(/["\\\n\r\f]/g, (sign) => `\\${sign.charCodeAt(0).toString(16)} `)}"`;

export interface Foot {
  left: string;
  right: string;
}

const FACE = "font: 8pt 'Atkinson Hyperlegible Next Variable', sans-serif; vertical-align: top;";

/** The size of the sheet, and the foot of every one with its number. Exported for its test. */
export const pageRules = (paper: PaperName, { left, right }: Foot): string => `@page {
  size: ${PAPERS[paper].width} ${PAPERS[paper].height};
  margin: 12mm 13mm 16mm;
  @bottom-left { content: ${quoted(left)}; ${FACE} padding-top: 3mm; text-align: left; }
  @bottom-right { content: ${quoted(`${right} · page `)} counter(page) " of " counter(pages); ${FACE} padding-top: 3mm; text-align: right; }
}`;

/** Made by script: the content policy allows no sheet of styles within the page. */
export function usePageRules(paper: PaperName, { left, right }: Foot) {
  useEffect(() => {
    const sheet = new CSSStyleSheet();
    sheet.replaceSync(pageRules(paper, { left, right }));
    document.adoptedStyleSheets = [...document.adoptedStyleSheets, sheet];
    return () => {
      document.adoptedStyleSheets = document.adoptedStyleSheets.filter((one) => one !== sheet);
    };
  }, [paper, left, right]);
}

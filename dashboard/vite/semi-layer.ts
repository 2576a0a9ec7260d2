import type { Plugin } from 'vite';

const SEMI_CSS = /[\\/]@douyinfe[\\/].*\.css(\?.*)?$/;
const FONT_FAMILY = /font-family:\s*(?!var\(--font)[^;}]+/g;

/**
 * Puts the component library's style sheets into a cascade layer of their own and gives them our prose face.
 * Lazy chunks load those sheets after ours; in a layer they lose to every unlayered rule, whatever the order.
 */
export function semiLayer(): Plugin {
  return {
    name: 'ampkeep-semi-layer',
    enforce: 'pre',
    transform(code, id) {
      if (!SEMI_CSS.test(id)) return null;
      return {
        code: `@layer semi {\n${code.replace(FONT_FAMILY, 'font-family: var(--font-prose)')}\n}`,
        map: null,
      };
    },
  };
}

// The few rules that only a stylesheet can say: theme variables, the focus ring, reduced motion, font faces.

import { fontFaceRules } from "./fonts.ts";
import { type ColorName, dark, light, type Palette } from "./tokens.ts";

const STYLE_ID = "linkwright-theme";

function declarations(palette: Palette): string {
  return (Object.keys(palette) as ColorName[]).map((name) => `--${name}:${palette[name]}`).join(";");
}

function themeRules(): string {
  return `
:root{color-scheme:light;${declarations(light)}}
@media (prefers-color-scheme:dark){:root:not([data-theme=light]){color-scheme:dark;${declarations(dark)}}}
:root[data-theme=dark]{color-scheme:dark;${declarations(dark)}}
html,body{background:var(--ground);color:var(--ink)}
a{color:inherit}
:focus{outline:none}
:focus-visible{outline:2px solid var(--dye)!important;outline-offset:2px}
[tabindex="-1"]:focus-visible{outline:none!important}
.on-steel{color-scheme:dark;${declarations(dark)}}
::selection{background:var(--dye);color:var(--onDye)}
::placeholder{color:var(--inkSoft);opacity:1}
input,textarea,select,button{font:inherit}
select option{background:var(--panel);color:var(--ink)}
dialog{border:0;padding:0;background:transparent;color:inherit;max-width:none;max-height:none}
dialog::backdrop{background:var(--veil)}
.skip-link{position:absolute;left:8px;top:-100px;z-index:100;background:var(--dye);color:var(--onDye);padding:12px 16px}
.skip-link:focus{top:8px}
.visually-hidden{position:absolute;width:1px;height:1px;margin:-1px;overflow:hidden;clip-path:inset(50%);white-space:nowrap}
html:has(dialog[open]){overflow:hidden}
.button-primary:not(:disabled):hover{background-color:var(--dyeHover);border-color:var(--dyeHover)}
.button-secondary:not(:disabled):hover,.button-quiet:not(:disabled):hover,.stepper:not(:disabled):hover{background-color:var(--hover)}
.button-danger:not(:disabled):hover{filter:brightness(.92)}
.block-link:hover{border-color:var(--dye)}
.choice:has(:focus-visible){outline:2px solid var(--dye);outline-offset:2px;z-index:1}
.tab:hover{color:var(--ink)}
.row-link:hover{background-color:var(--hover)}
.choice input:focus-visible{outline:none!important}
.pane{height:100%;overflow:auto;display:flex;flex-direction:column}
.pane-handle{position:relative;background:var(--rule);flex-shrink:0}
.pane-handle-horizontal{width:1px;cursor:col-resize}
.pane-handle-vertical{height:1px;cursor:row-resize}
.pane-handle::after{content:"";position:absolute;background:var(--edge);border-radius:2px;opacity:0;transition:opacity .12s}
.pane-handle-horizontal::after{width:5px;height:44px;left:-2px;top:calc(50% - 22px)}
.pane-handle-vertical::after{height:5px;width:44px;top:-2px;left:calc(50% - 22px)}
.pane-handle:hover::after,.pane-handle:focus-visible::after,.pane-handle[data-separator=active]::after{opacity:1}
@keyframes lw-breathe{0%,100%{opacity:1}50%{opacity:.45}}
.breathes{animation:lw-breathe 1.6s ease-in-out infinite}
@media (prefers-reduced-motion:reduce){*,*::before,*::after{animation:none!important;transition:none!important;scroll-behavior:auto!important}}
@media print{.no-print{display:none!important}}
`;
}

/** Idempotent; called once before the first render. */
export function installStylesheet(): void {
  if (document.getElementById(STYLE_ID)) return;
  const style = document.createElement("style");
  style.id = STYLE_ID;
  style.textContent = fontFaceRules() + themeRules();
  document.head.append(style);
}

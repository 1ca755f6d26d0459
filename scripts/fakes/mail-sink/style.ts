/** The product's paper, ink and copper, without its fonts: this page stands alone. */
export const style = `
:root{color-scheme:light dark;--paper:#efe9dc;--sheet:#faf7ef;--rule:#d8cfbb;--ink:#1d211e;--soft:#555b52;--copper:#9a4a17;--ground:#f3e0cf;--focus:#0b57c2;
--text:"Atkinson Hyperlegible Next Variable",system-ui,sans-serif;--mono:"Martian Mono Variable",ui-monospace,monospace}
@media(prefers-color-scheme:dark){:root{--paper:#141210;--sheet:#1c1916;--rule:#38322a;--ink:#efe8d8;--soft:#b3aa98;--copper:#eb9a5c;--ground:#3a2617;--focus:#8ab8ff}}
*{box-sizing:border-box}
body{margin:0 auto;max-width:72rem;padding:1.5rem 1rem 4rem;background:var(--paper);color:var(--ink);font:400 16px/1.5 var(--text)}
h1{font-size:1.35rem;line-height:1.2;margin:0 0 .25rem;overflow-wrap:anywhere}
h2{font-size:1rem;margin:2rem 0 .5rem}
p{margin:.25rem 0 1rem;color:var(--soft)}
a{color:var(--copper);text-underline-offset:.2em}
a:focus-visible{outline:2px solid var(--focus);outline-offset:2px}
table{width:100%;border-collapse:collapse;background:var(--sheet);border:1px solid var(--rule)}
th,td{padding:.5rem .75rem;border-bottom:1px solid var(--rule);text-align:left;vertical-align:top;overflow-wrap:anywhere}
th{font-weight:600;color:var(--soft);font-size:.875rem}
time,.mono,pre{font-family:var(--mono);font-size:.8125rem}
time{white-space:nowrap}
nav{display:flex;flex-wrap:wrap;gap:1rem;margin:1rem 0;border-bottom:2px solid var(--copper);padding-bottom:.5rem}
nav a[aria-current]{color:var(--ink);background:var(--ground);padding:0 .5rem;text-decoration:none}
iframe{display:block;width:100%;height:70vh;border:1px solid var(--rule);background:#fff}
pre{white-space:pre-wrap;overflow-wrap:anywhere;background:var(--sheet);border:1px solid var(--rule);padding:1rem;margin:0}
ul{padding-left:1.25rem}li{overflow-wrap:anywhere;margin:.25rem 0}
@media(max-width:40rem){thead{display:none}tr,td{display:block;border:0;padding:.15rem .75rem}tr{border-bottom:1px solid var(--rule);padding:.5rem 0}}
`;

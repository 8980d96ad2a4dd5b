/**
 * Style of the hosted page. Text on ground is at least 7:1, buttons at least 4.5:1 (WCAG 2.2, 1.4.3); targets are at
 * least 44 px high.
 */
export const payStyle = `
:root { color-scheme: light; }
* { box-sizing: border-box; }
body { margin: 0; background: #eef1ec; color: #1d2a24; font: 1.0625rem/1.5 Georgia, "Times New Roman", serif; }
main { max-width: 40rem; margin: 0 auto; padding: 1rem 1rem 3rem; }
h1 { font-size: 1.625rem; margin: 1rem 0 .25rem; }
h2 { font-size: 1.1875rem; margin: 2rem 0 .5rem; border-top: 3px double #1d2a24; padding-top: .75rem; }
.notice { border-left: 6px solid #1d5c41; background: #fff; padding: .75rem 1rem; }
.refused { border-left: 6px solid #96281b; background: #fff; padding: .75rem 1rem; }
table { width: 100%; border-collapse: collapse; background: #fff; }
caption { text-align: left; padding: .25rem 0; }
th, td { padding: .5rem; text-align: left; vertical-align: top; border-bottom: 1px solid #8a968f; overflow-wrap: anywhere; }
.sum { text-align: right; white-space: nowrap; }
tfoot th, tfoot td { border-bottom: 0; font-weight: 700; font-size: 1.125rem; }
tbody th { font-weight: 400; }
form { margin: 1rem 0; }
form p { margin: .25rem 0 0; }
button, .button { display: inline-block; min-height: 2.75rem; padding: .5rem 1.25rem; font: inherit; font-weight: 700;
  color: #1d2a24; background: #fff; border: 2px solid #1d2a24; border-radius: 2px; cursor: pointer; text-decoration: none; }
.pay button { color: #fff; background: #1d5c41; border-color: #1d5c41; width: 100%; }
button:hover, .button:hover { text-decoration: underline; }
:focus-visible { outline: 3px solid #0b57d0; outline-offset: 3px; }
`;

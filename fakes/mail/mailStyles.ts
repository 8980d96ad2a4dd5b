/**
 * The reading page's look. Text and control colours keep at least 4.5:1 on their grounds and borders of controls
 * 3:1, in both schemes (WCAG 2.2, 1.4.3 and 1.4.11); nothing is wider than the window at 320 px (1.4.10).
 */
export const mailStyles = `
:root {
  color-scheme: light dark;
  --ground: #f7f6f2; --panel: #ffffff; --text: #1f2426; --quiet: #535b5e; --line: #c9ccc8;
  --control: #6b7477; --link: #0b5568; --notice: #7a3b00; --notice-ground: #fdf0dc;
}
@media (prefers-color-scheme: dark) {
  :root {
    --ground: #16191a; --panel: #1f2426; --text: #eceeec; --quiet: #aeb6b8; --line: #3b4346;
    --control: #8b9497; --link: #8fd3e6; --notice: #ffc98a; --notice-ground: #3a2a14;
  }
}
* { box-sizing: border-box; }
body { margin: 0; background: var(--ground); color: var(--text); font: 1rem/1.5 system-ui, sans-serif; }
main, header { max-width: 60rem; margin: 0 auto; padding: 1rem; overflow-wrap: anywhere; }
header { display: flex; flex-wrap: wrap; gap: 0.5rem 1rem; align-items: center; justify-content: space-between; padding-bottom: 0; }
h1 { font-size: 1.5rem; line-height: 1.25; margin: 0; }
h2 { font-size: 1.125rem; margin: 1.75rem 0 0.5rem; }
a { color: var(--link); display: inline-block; padding-block: 0.25rem; }
a:focus-visible, button:focus-visible, summary:focus-visible, iframe:focus-visible { outline: 3px solid var(--link); outline-offset: 2px; }
button { font: inherit; color: var(--text); background: var(--panel); border: 1px solid var(--control); border-radius: 4px; min-height: 2.75rem; padding: 0 1rem; cursor: pointer; }
.mails { list-style: none; margin: 0; padding: 0; }
.mails li { background: var(--panel); border: 1px solid var(--line); border-radius: 4px; padding: 0.5rem 1rem; margin-block: 0.5rem; }
.mails a { font-weight: 600; }
.mails p { margin: 0; color: var(--quiet); }
.again { color: var(--notice); background: var(--notice-ground); padding: 0.25rem 0.5rem; border-radius: 4px; }
.mails .again { color: var(--notice); display: inline-block; }
dl { display: grid; grid-template-columns: minmax(6rem, max-content) minmax(0, 1fr); gap: 0.25rem 1rem; margin: 1rem 0; }
dt { color: var(--quiet); }
dd { margin: 0; }
iframe { width: 100%; height: 70vh; min-height: 20rem; resize: vertical; border: 1px solid var(--control); background: #ffffff; }
pre { white-space: pre-wrap; background: var(--panel); border: 1px solid var(--line); border-radius: 4px; padding: 1rem; margin: 0; }
summary { cursor: pointer; min-height: 2.75rem; display: list-item; padding-block: 0.5rem; }
@media (max-width: 30rem) { dl { grid-template-columns: minmax(0, 1fr); } dd { margin-bottom: 0.5rem; } }
`;

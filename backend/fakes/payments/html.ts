const STYLE = `
  body { max-width: 36rem; margin: 2rem auto; padding: 0 1rem; font: 1rem/1.5 ui-monospace, monospace; color: #222; background: #f4f1e8; }
  .notice { padding: .75rem 1rem; border: 2px dashed #222; background: #ffe9a8; }
  form { margin: 1rem 0; } label { display: block; } button { font: inherit; padding: .25rem .75rem; }
  .refused { font-weight: bold; color: #a00; } td, th { padding: .1rem .75rem .1rem 0; text-align: left; }
  @media (prefers-color-scheme: dark) { body { color: #eee; background: #222; } .notice { color: #222; } .refused { color: #faa; } a { color: #9cf; } }`;

/** A page of the stand-in, plainly marked as one. */
export function page(title: string, ...content: string[]): string {
  return `<!doctype html>
<html lang="en"><head><meta charset="utf-8"><meta name="viewport" content="width=device-width"><link rel="icon" href="data:,">
<title>${escape(title)} · stand-in</title><style>${STYLE}</style></head>
<body><p class="notice"><strong>Local stand-in for the payment service.</strong> No card is asked for, no money moves.</p>
<h1>${escape(title)}</h1>
${content.join('\n')}
</body></html>`;
}

export function escape(text: string): string {
  return text.replace(/[&<>"']/g, (character) => `&#${character.charCodeAt(0)};`);
}

export function paragraph(text: string): string {
  return `<p>${escape(text)}</p>`;
}

export function form(action: string, button: string, fields = ''): string {
  return `<form method="post" action="${escape(action)}">${fields}<button>${escape(button)}</button></form>`;
}

export function choice(name: string, options: Record<string, string>): string {
  return Object.entries(options)
    .map(
      ([value, label], index) =>
        `<label><input type="radio" name="${name}" value="${value}"${index === 0 ? ' checked' : ''}> ${escape(label)}</label>`,
    )
    .join('');
}

export function link(to: string, text: string): string {
  return `<p><a href="${escape(to)}">${escape(text)}</a></p>`;
}

export function table(rows: string[][]): string {
  const cells = rows.map((row) => `<tr>${row.map((cell) => `<td>${escape(cell)}</td>`).join('')}</tr>`);
  return `<table>${cells.join('')}</table>`;
}

/** 1234 cents as “12.34 EUR”. */
export function money(cents: number, currency: string): string {
  return `${(cents / 100).toFixed(2)} ${currency.toUpperCase()}`;
}

export function day(time: number): string {
  return new Date(time * 1000).toISOString().slice(0, 10);
}

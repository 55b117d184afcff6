import { fileOf, type Picture } from './pictures';

const safe = (text: string) => text.replaceAll('&', '&amp;').replaceAll('<', '&lt;');

/** One page that shows every picture, screen by screen, each leading to its full size. */
export const indexPage = (pictures: readonly Picture[]): string => {
  const screens = [...new Set(pictures.map(({ screen }) => screen))];
  const figure = (picture: Picture) =>
    `<figure><a href="${fileOf(picture)}"><img loading="lazy" src="${fileOf(picture)}" alt=""></a>` +
    `<figcaption>${safe(`${picture.state}, ${picture.theme}, ${picture.width} px`)}</figcaption></figure>`;
  const section = (screen: string) =>
    `<h2>${safe(screen)}</h2><div>${pictures
      .filter((one) => one.screen === screen)
      .map(figure)
      .join('')}</div>`;
  return `<!doctype html><html lang="en"><meta charset="utf-8"><title>Every screen</title>
<style>body{font:16px system-ui;margin:2rem}div{display:flex;flex-wrap:wrap;gap:1rem;align-items:start}
figure{margin:0;width:18rem}img{width:100%;max-height:30rem;object-fit:cover;object-position:top;border:1px solid #999}</style>
<h1>Every screen</h1>${screens.map(section).join('')}</html>`;
};

/** Drawn stand-ins for photos: 800 × 600, one for each kind of damage that the story tells of. */
const WIDTH = 800;
const HEIGHT = 600;

const frame = (
  shapes: string,
): string => `<svg xmlns="http://www.w3.org/2000/svg" width="${WIDTH}" height="${HEIGHT}">
  <defs>
    <linearGradient id="floor" x1="0" y1="0" x2="1" y2="1">
      <stop offset="0" stop-color="#a7a8a4"/><stop offset="1" stop-color="#7c7f7d"/>
    </linearGradient>
    <pattern id="weave" width="8" height="8" patternUnits="userSpaceOnUse">
      <path d="M0 4h8M4 0v8" stroke="#000" stroke-opacity=".18" stroke-width="1.5"/>
    </pattern>
  </defs>
  <rect width="${WIDTH}" height="${HEIGHT}" fill="url(#floor)"/>
  <path d="M0 452 L800 418" stroke="#6b6e6c" stroke-width="3"/>
  ${shapes}
</svg>`;

interface LinkLook {
  length?: number;
  colour?: string;
}

/** A run of links, every second one seen from its side. */
function chain(looks: Record<number, LinkLook> = {}, extra = ''): string {
  let x = 30;
  const links: string[] = [];
  for (let index = 0; x < 760; index++) {
    const { length = 150, colour = '#4b5055' } = looks[index] ?? {};
    const height = index % 2 === 0 ? 92 : 30;
    links.push(
      `<rect x="${x}" y="${300 - height / 2}" width="${length}" height="${height}" rx="${height / 2}" fill="none" stroke="${colour}" stroke-width="26"/>`,
    );
    x += length - 48;
  }
  return frame(links.join('') + extra);
}

/** A laid rope along a path, with what sticks out of it or lies on it. */
function rope(path: string, colour: string, lay: string, extra = ''): string {
  return frame(
    `<path d="${path}" fill="none" stroke="#2f3234" stroke-width="58" stroke-linecap="round"/>
     <path d="${path}" fill="none" stroke="${colour}" stroke-width="50"/>
     <path d="${path}" fill="none" stroke="${lay}" stroke-width="50" stroke-dasharray="5 17"/>${extra}`,
  );
}

const STRAIGHT = 'M0 320 L800 280';

/** A flat web across the picture. */
const web = (colour: string, extra: string): string =>
  frame(
    `<g transform="rotate(-6 400 300)"><rect x="-60" y="210" width="920" height="180" fill="${colour}"/>
     <rect x="-60" y="210" width="920" height="180" fill="url(#weave)"/>
     <path d="M-60 232h920M-60 368h920" stroke="#fff" stroke-opacity=".45" stroke-width="4"/>${extra}</g>`,
  );

const mesh = (extra: string): string => {
  const spirals = Array.from(
    { length: 16 },
    (_, row) =>
      `<path d="M40 ${120 + row * 23} ${Array.from({ length: 48 }, (_step, step) => `l15 ${step % 2 === 0 ? 18 : -18}`).join(' ')}" fill="none" stroke="#5d6367" stroke-width="6"/>`,
  );
  return frame(spirals.join('') + extra);
};

const tagRing = (tag: string): string =>
  chain({}, `<circle cx="400" cy="410" r="58" fill="none" stroke="#70757a" stroke-width="12"/>${tag}`);

const frayed = (x: number, y: number, colour: string): string =>
  Array.from(
    { length: 9 },
    (_, index) =>
      `<path d="M${x + index * 6} ${y} q${index * 9 - 36} -46 ${index * 13 - 52} -84" fill="none" stroke="${colour}" stroke-width="4"/>`,
  ).join('');

const PICTURES = {
  stretchedLink: chain({ 2: { length: 205 }, 4: { length: 190 } }),
  nickedLink: chain(
    {},
    '<path d="M452 238 l16 30 l18 -32z" fill="#d9dcde"/><path d="M452 238 l16 30" stroke="#222" stroke-width="4"/>',
  ),
  blueLink: chain({ 3: { colour: '#39507e' }, 4: { colour: '#5b4a86' }, 5: { colour: '#8a6d3a' } }),
  weldedLink: chain(
    {},
    '<path d="M420 252 q22 -34 46 -4 q22 22 -8 32 q-34 10 -38 -28z" fill="#6d6258" stroke="#2c2724" stroke-width="5"/>',
  ),
  openLatch: frame(
    `<path d="M400 60 v120 q150 40 130 190 q-30 140 -170 120 q-110 -30 -90 -150" fill="none" stroke="#b8791c" stroke-width="54" stroke-linecap="round"/>
     <path d="M398 196 L300 150" stroke="#3c4246" stroke-width="20" stroke-linecap="round"/>
     <circle cx="400" cy="196" r="15" fill="#22262a"/>`,
  ),
  emptyTagRing: tagRing(''),
  newTag: tagRing(
    `<rect x="300" y="440" width="210" height="120" rx="10" fill="#d8dadb" stroke="#565b5f" stroke-width="6"/>
     <path d="M324 474h150M324 502h110M324 530h134" stroke="#33383c" stroke-width="9"/>`,
  ),
  kinkedRope: rope('M0 360 L360 320 Q430 210 470 330 L800 270', '#8c9195', '#43484c'),
  rustyRope: rope(
    STRAIGHT,
    '#8a5a36',
    '#4f2f1c',
    '<rect x="600" y="244" width="150" height="88" rx="16" fill="#9aa0a4"/>',
  ),
  brokenWires: rope(
    STRAIGHT,
    '#8c9195',
    '#43484c',
    `${frayed(420, 280, '#d7dadc')}<rect x="600" y="244" width="150" height="88" rx="16" fill="#9aa0a4"/>`,
  ),
  frayedRope: rope(STRAIGHT, '#d9d2bd', '#a39a7f', frayed(380, 286, '#f2ecd8')),
  openMesh: mesh('<path d="M40 282 l70 -34 M40 328 l84 30" stroke="#c8cdd0" stroke-width="7"/>'),
  cutWeb: web('#2f6b4a', '<path d="M430 390 L452 300 L470 392z" fill="#8f918f"/>'),
  openStitching: web(
    '#b78c1f',
    `<g stroke="#fff" stroke-width="5" stroke-dasharray="16 10"><path d="M240 262h330M240 290h130M240 318h330M240 346h90"/></g>${frayed(390, 300, '#fff')}`,
  ),
  openCover: web(
    '#7b3f78',
    '<ellipse cx="430" cy="300" rx="92" ry="42" fill="#efeee6" stroke="#4c2449" stroke-width="6"/><path d="M346 290h168M346 304h168M352 318h156" stroke="#cfcdbf" stroke-width="6"/>',
  ),
  destroyedTextile: frame(
    [0, 1, 2, 3]
      .map(
        (piece) =>
          `<rect x="${60 + piece * 180}" y="${220 + (piece % 2) * 60}" width="140" height="120" fill="#2f6b4a" transform="rotate(${piece * 23 - 30} ${130 + piece * 180} 280)"/>`,
      )
      .join(''),
  ),
  destroyedMetal: frame(
    [0, 1, 2, 3, 4]
      .map(
        (piece) =>
          `<path d="M${90 + piece * 145} ${220 + (piece % 3) * 70} a48 48 0 1 1 30 88" fill="none" stroke="#4b5055" stroke-width="26"/>`,
      )
      .join(''),
  ),
} as const satisfies Record<string, string>;

export type PictureName = keyof typeof PICTURES;

/** Each picture's name and drawing (SVG). */
export function listPictures(): { name: PictureName; svg: string }[] {
  return (Object.keys(PICTURES) as PictureName[]).map((name) => ({ name, svg: PICTURES[name] }));
}

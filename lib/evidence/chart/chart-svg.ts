import type { LineLook } from './line-look';
import { BAND, BAND_INK, GRID, ON_PAPER, WINDOW } from './on-paper';
import type { ChartPaths, PanelPaths } from './paths';

/** A chart as one SVG document for a paper: fonts of the reader, colours of the day, everything named in words. */
export function chartSvg(paths: ChartPaths): string {
  const { width, height, left, right, panels, soak, says } = paths;
  const [detail, whole] = panels;
  const rows = Math.ceil(paths.legend.length / 4);
  const window = soak
    ? `<rect x="${soak.from}" y="${detail.top}" width="${Math.max(1, soak.to - soak.from)}" height="${whole.bottom - detail.top}" fill="${WINDOW}"/>`
    : '';
  return [
    `<svg xmlns="http://www.w3.org/2000/svg" viewBox="0 0 ${width} ${height + rows * 18}" role="img" font-family="Barlow Semi Condensed, Arial Narrow, sans-serif" font-size="12">`,
    `<title>${escaped(says)}</title>`,
    window,
    ...panels.map((panel) => panelSvg(panel, left, right)),
    timeAxis(paths),
    soak ? soakSvg(soak, detail.top, whole.bottom) : '',
    `<text x="${left + 8}" y="${detail.band.upper - 5}" fill="${BAND_INK}" font-weight="600">${escaped(paths.bandSays)}</text>`,
    ...paths.events.map(
      ({ number, x, y }) =>
        `<circle cx="${x}" cy="${y}" r="8" fill="${ON_PAPER.ink}"/><text x="${x}" y="${y + 4}" fill="#FFFFFF" text-anchor="middle" font-weight="600">${number}</text>`,
    ),
    ...paths.legend.map((one, at) =>
      legendSvg(one, left + (at % 4) * ((right - left) / 4), height + Math.floor(at / 4) * 18 + 8),
    ),
    '</svg>',
  ].join('');
}

const panelSvg = ({ top, bottom, ticks, band, lines }: PanelPaths, left: number, right: number): string =>
  [
    ...ticks.map(
      ({ at, says }) =>
        `<path d="M${left} ${at}H${right}" stroke="${GRID}"/><text x="${left - 6}" y="${at + 4}" text-anchor="end" fill="${ON_PAPER.quiet}">${says}</text>`,
    ),
    `<rect x="${left}" y="${band.upper}" width="${right - left}" height="${Math.max(0.5, band.lower - band.upper)}" fill="${BAND}" fill-opacity="0.7"/>`,
    `<path d="M${left} ${band.upper}H${right}M${left} ${band.lower}H${right}" stroke="${BAND_INK}"/>`,
    ...lines.map(({ d, look }) => `<path d="${d}" fill="none" ${strokeOf(look)}/>`),
    `<path d="M${left} ${top}V${bottom}H${right}" fill="none" stroke="${ON_PAPER.ink}"/>`,
  ].join('');

const strokeOf = ({ ink, width, dash }: LineLook): string =>
  `stroke="${ON_PAPER[ink]}" stroke-width="${width}" stroke-linejoin="round"${dash.length > 0 ? ` stroke-dasharray="${dash.join(' ')}"` : ''}`;

const timeAxis = ({ timeTicks, panels }: ChartPaths): string =>
  timeTicks
    .map(
      ({ at, says }) =>
        `<path d="M${at} ${panels[1].bottom}v5" stroke="${ON_PAPER.ink}"/><text x="${at}" y="${panels[1].bottom + 18}" text-anchor="middle" fill="${ON_PAPER.quiet}">${says}</text>`,
    )
    .join('');

const soakSvg = ({ from, to, says }: NonNullable<ChartPaths['soak']>, top: number, bottom: number): string =>
  `<path d="M${from} ${top - 12}V${bottom}M${to} ${top - 12}V${bottom}M${from} ${top - 8}H${to}" stroke="${ON_PAPER.ink}"/><text x="${(from + to) / 2}" y="${top - 14}" text-anchor="middle" font-weight="600" fill="${ON_PAPER.ink}">${escaped(says)}</text>`;

const legendSvg = ({ name, says, look }: ChartPaths['legend'][number], x: number, y: number): string =>
  `<path d="M${x} ${y - 4}h32" ${strokeOf(look)}/><text x="${x + 38}" y="${y}" fill="${ON_PAPER.ink}"><tspan font-weight="600">${escaped(name)}</tspan> ${escaped(says)}</text>`;

const escaped = (text: string): string => text.replace(/[<>&"]/g, (letter) => `&#${letter.charCodeAt(0)};`);

/**
 * The drawing tree: hast elements of SVG, a handful of shapes, presentation attributes only, so that the SVG
 * files, the web page and the PDF are drawn from the same tree. Lengths are PostScript points.
 *
 * - `svg` {viewBox, width, height, role: 'img'}, its first children `title` and `desc`
 * - `g` {transform: 'translate(x y)'}
 * - `rect`, `line`, `circle`, `path` (absolute M L H V C Z only): fill, fillOpacity, stroke, strokeWidth,
 *   strokeDasharray (a string such as `4 2`); colours are `#rrggbb` or `none`
 * - `text` {x, y (baseline), textAnchor, fontSize, fontWeight: 400 | 600, fontStyle, fill, transform: 'rotate(angle x y)'}
 *   holding one text node
 *
 * Anything else is refused by the PDF drawing.
 */
export const FIGURE_FONT = "'Source Sans 3', 'Helvetica Neue', Arial, sans-serif"

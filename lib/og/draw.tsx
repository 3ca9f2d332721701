import { ImageResponse } from 'next/og'
import { labToHex } from '@/lib/colour/display'
import type { Lab } from '@/lib/method/types'
import { PICTURE } from './colours'
import { HEADING, pictureFonts, TEXT } from './fonts'
import { inLetters } from './letters'
import { HEIGHT, type Picture, WIDTH } from './picture'

/** What the sheets say: the beginning of a page, so that the ink is seen as ink. */
const SAMPLE =
  'The lamp was lit before anyone had thought of it, and the page lay there as if it had always been that white. Outside, the boats had come in one behind the other; somebody was counting them.'

/** Draws a picture as PNG, 1200 × 630. Nothing but the picture's own text and our own fonts goes into it. */
export async function drawPicture(picture: Picture): Promise<Uint8Array<ArrayBuffer>> {
  const { fonts, letters } = pictureFonts()
  const write = (text: string) => inLetters(text, letters)
  const image = new ImageResponse(<Sheet picture={picture} write={write} />, { width: WIDTH, height: HEIGHT, fonts })
  return new Uint8Array(await image.arrayBuffer())
}

type Written = (text: string) => string

function Sheet({ picture, write }: { picture: Picture; write: Written }) {
  const { title, line, figure, sheets, paper, foot } = picture
  return (
    <div style={{ display: 'flex', width: '100%', height: '100%', background: PICTURE.bench, fontFamily: TEXT }}>
      <div style={{ display: 'flex', flexDirection: 'column', flex: 1, padding: '52px 44px 48px 64px' }}>
        <div style={{ display: 'flex', alignItems: 'center', color: PICTURE.shade, fontSize: 32, fontWeight: 600 }}>
          <Mark />
          Lampleaf
        </div>
        <div
          style={{
            display: 'flex',
            marginTop: 30,
            fontFamily: HEADING,
            fontSize: title.length > 20 ? 58 : 70,
            lineHeight: 1.06,
            color: PICTURE.ink,
          }}
        >
          {write(title)}
        </div>
        <div style={{ display: 'flex', marginTop: 18, fontSize: 30, lineHeight: 1.3, color: PICTURE.soft }}>
          {write(line)}
        </div>
        <div style={{ display: 'flex', alignItems: 'flex-end', marginTop: 'auto', color: PICTURE.ink }}>
          <div style={{ display: 'flex', fontFamily: HEADING, fontSize: 112, lineHeight: 0.95 }}>
            {write(figure.value)}
          </div>
          <div style={{ display: 'flex', marginLeft: 18, marginBottom: 8, fontSize: 44 }}>{write(figure.doubt)}</div>
        </div>
        <div style={{ display: 'flex', marginTop: 10, fontSize: 30, color: PICTURE.ink }}>{write(figure.label)}</div>
        <div style={{ display: 'flex', marginTop: 26, fontSize: 26, color: PICTURE.soft }}>{write(foot)}</div>
      </div>
      <Booth sheets={sheets} paper={paper} />
    </div>
  )
}

/** The neutral surround: the sheets side by side, the control paper touching each along its foot. */
function Booth({ sheets, paper }: Pick<Picture, 'sheets' | 'paper'>) {
  const width = sheets.length === 1 ? 300 : 384 / sheets.length
  const fontSize = sheets.length === 1 ? 24 : 14
  return (
    <div
      style={{ display: 'flex', width: 460, alignItems: 'center', justifyContent: 'center', background: PICTURE.booth }}
    >
      {sheets.map(({ page, ink }, place) => (
        // biome-ignore lint/suspicious/noArrayIndexKey: drawn once, never again
        <div key={place} style={{ display: 'flex', flexDirection: 'column', width }}>
          <Leaf page={page} ink={ink} width={width} fontSize={fontSize} />
          <div style={{ display: 'flex', height: 64, background: labToHex(paper) }} />
        </div>
      ))}
    </div>
  )
}

function Leaf({ page, ink, width, fontSize }: { page: Lab; ink: Lab; width: number; fontSize: number }) {
  return (
    <div
      style={{
        display: 'flex',
        height: 400,
        width,
        overflow: 'hidden',
        padding: width / 12,
        background: labToHex(page),
        color: labToHex(ink),
        fontFamily: HEADING,
        fontSize,
        lineHeight: 1.5,
      }}
    >
      {SAMPLE}
    </div>
  )
}

/** The lamp over the sheet, in the colours of the day. */
function Mark() {
  return (
    <svg width="44" height="44" viewBox="0 0 32 32" fill="none" style={{ marginRight: 12 }} aria-hidden="true">
      <path d="M16 1.5v3" stroke={PICTURE.brass} strokeWidth="2" />
      <path d="M7.5 13c0-5 3.8-9 8.5-9s8.5 4 8.5 9z" fill={PICTURE.shade} />
      <path d="M4.5 14h23" stroke={PICTURE.brass} strokeWidth="2.2" strokeLinecap="round" />
      <path d="M9 18.8h14v10.7H9z" stroke={PICTURE.ink} strokeWidth="1.8" strokeLinejoin="round" />
      <path d="M12 22.4h8M12 25.8h5" stroke={PICTURE.ink} strokeWidth="1.6" strokeLinecap="round" />
    </svg>
  )
}

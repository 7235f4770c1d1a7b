/** A typeface in one weight and slope. `fallback` stands in for characters that the others lack. */
export type Face =
  | 'serif'
  | 'serifItalic'
  | 'serifSemibold'
  | 'sans'
  | 'sansItalic'
  | 'sansSemibold'
  | 'code'
  | 'fallback'

export interface FontSource {
  /** Name of the file, here and beside the built program. */
  readonly file: string
  /** The npm package it comes from, and the folder in it; the built program needs neither. */
  readonly package: string
  readonly folder: string
  readonly licence: string
}

const expo = (family: string, style: string, file: string): FontSource => ({
  file,
  package: `@expo-google-fonts/${family}`,
  folder: style,
  licence: 'LICENSE_FONT',
})

/** The font files a report is set in, and no others are shipped. The build reads this list too. */
export const FONT_FACES: Readonly<Record<Face, FontSource>> = {
  serif: expo('source-serif-4', '400Regular', 'SourceSerif4_400Regular.ttf'),
  serifItalic: expo('source-serif-4', '400Regular_Italic', 'SourceSerif4_400Regular_Italic.ttf'),
  serifSemibold: expo('source-serif-4', '600SemiBold', 'SourceSerif4_600SemiBold.ttf'),
  sans: expo('source-sans-3', '400Regular', 'SourceSans3_400Regular.ttf'),
  sansItalic: expo('source-sans-3', '400Regular_Italic', 'SourceSans3_400Regular_Italic.ttf'),
  sansSemibold: expo('source-sans-3', '600SemiBold', 'SourceSans3_600SemiBold.ttf'),
  code: expo('source-code-pro', '400Regular', 'SourceCodePro_400Regular.ttf'),
  fallback: { file: 'DejaVuSans.ttf', package: 'dejavu-fonts-ttf', folder: 'ttf', licence: 'LICENSE' },
}

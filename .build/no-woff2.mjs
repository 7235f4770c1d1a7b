// Stands in for the Brotli decoder in the bundle: 1.3 MB that only woff2 fonts need, and none is shipped.
export default function decompress() {
  throw new Error('woff2 fonts cannot be read')
}

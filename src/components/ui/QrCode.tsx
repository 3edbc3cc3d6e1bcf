interface QrCodeProps {
  /** A whole SVG document, dark on light, as the qrcode library writes it. */
  svg: string
  /** What it opens: "Seat 3 of Tuesday's evening". */
  label: string
}

/** A QR code that stays dark on light in both schemes, since cameras want it so. */
export function QrCode({ svg, label }: QrCodeProps) {
  return (
    <img className="qr" src={`data:image/svg+xml,${encodeURIComponent(svg)}`} alt={`QR code: ${label}`} />
  )
}

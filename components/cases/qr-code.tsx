export interface QrCodeProps {
  /** From `qrCode` in lib/cases/qr-code. */
  viewBox: string;
  path: string;
  /** What it opens: "QR code of CT-2607-0042". */
  label: string;
}

/** A QR code, black on white in either theme: a scanner reads nothing else. */
export function QrCode({ viewBox, path, label }: QrCodeProps) {
  return (
    <svg className="qr" viewBox={viewBox} shapeRendering="crispEdges" role="img" aria-label={label}>
      <path d={path} />
    </svg>
  );
}

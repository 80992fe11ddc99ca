import { Path, Svg } from '@react-pdf/renderer';

import { qrPath } from './qr-path';

/** A code to scan, drawn as one path so that it stays sharp on any printer. */
export function QrCode({ text, size }: { text: string; size: number }) {
  const { width, path } = qrPath(text);
  return (
    <Svg width={size} height={size} viewBox={`0 0 ${width} ${width}`}>
      <Path d={path} fill="#000000" />
    </Svg>
  );
}

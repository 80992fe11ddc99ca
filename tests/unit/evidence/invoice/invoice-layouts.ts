import { PDFDocument, StandardFonts } from 'pdf-lib';

/** Words put on a page of 612 × 792 points, from its upper left corner. */
export type Put = readonly [x: number, y: number, text: string];

/** A text PDF. `right` puts a word's right edge at x. */
export async function pdfOf(
  puts: readonly Put[],
  { right = [] as readonly Put[] } = {},
): Promise<Uint8Array> {
  const pdf = await PDFDocument.create();
  const page = pdf.addPage([612, 792]);
  const font = await pdf.embedFont(StandardFonts.Helvetica);
  const size = 10;
  for (const [x, y, text] of puts) page.drawText(text, { x, y: 792 - y, size, font });
  for (const [x, y, text] of right)
    page.drawText(text, { x: x - font.widthOfTextAtSize(text, size), y: 792 - y, size, font });
  return pdf.save();
}

/** A usual American invoice: labels on the right, a table with its sums under the last column. */
export const american = () =>
  pdfOf(
    [
      [50, 60, 'EXAMPLE THERMAL, INC.'],
      [50, 74, '12 Kiln Road, Dayton, OH 45402'],
      [400, 60, 'INVOICE'],
      [400, 80, 'Invoice No.:'],
      [480, 80, 'INV-00123'],
      [400, 94, 'Invoice Date:'],
      [480, 94, '03/14/2026'],
      [400, 108, 'Your P.O.:'],
      [480, 108, 'PO-5001'],
      [400, 122, 'Terms:'],
      [480, 122, '2% 10, Net 30'],
      [50, 200, 'Item'],
      [90, 200, 'Part Number'],
      [180, 200, 'Description'],
      [50, 220, '1'],
      [90, 220, '10-200'],
      [180, 220, 'Solution heat treat per AMS 2770'],
      [50, 236, '2'],
      [90, 236, '10-311'],
      [180, 236, 'Solution heat treat per AMS 2770'],
      [400, 280, 'Subtotal'],
      [400, 296, 'Lot minimum adjustment'],
      [400, 312, 'Certification fee'],
      [400, 328, 'Freight'],
      [400, 344, 'Sales tax 8%'],
      [400, 364, 'TOTAL DUE'],
      [50, 500, 'Remit by ACH to Lakeside Bank, Routing No. 041000124, Account No. 7788 9900 12'],
    ],
    {
      right: [
        [400, 200, 'Qty'],
        [470, 200, 'Unit Price'],
        [560, 200, 'Amount'],
        [400, 220, '12'],
        [470, 220, '$2.50'],
        [560, 220, '$30.00'],
        [400, 236, '8'],
        [470, 236, '$2.50'],
        [560, 236, '$20.00'],
        [560, 280, '$50.00'],
        [560, 296, '$50.00'],
        [560, 312, '$10.00'],
        [560, 328, '$0.00'],
        [560, 344, '$8.00'],
        [560, 364, '$118.00'],
      ],
    },
  );

/** A European one: day first, decimal commas, the charges as rows of the table. */
export const european = () =>
  pdfOf(
    [
      [50, 60, 'Beispiel Härterei GmbH'],
      [50, 74, 'Ofenweg 3, 70173 Stuttgart, Deutschland'],
      [50, 130, 'Rechnung Nr. 2026-0417'],
      [50, 150, 'Rechnungsdatum: 14.03.2026'],
      [300, 150, 'Fällig am: 13.04.2026'],
      [50, 166, 'Ihre Bestellung: PO-5001'],
      [50, 200, 'Pos'],
      [80, 200, 'Teile-Nr.'],
      [170, 200, 'Bezeichnung'],
      [50, 220, '1'],
      [80, 220, '10-200'],
      [170, 220, 'Lösungsglühen'],
      [50, 236, '2'],
      [170, 236, 'Zeugnis'],
      [300, 270, 'Zwischensumme'],
      [300, 286, 'MwSt. 19 %'],
      [300, 302, 'Rechnungsbetrag EUR'],
      [50, 400, 'IBAN DE02 1203 0000 0000 2020 51 BIC BYLADEM1001'],
    ],
    {
      right: [
        [380, 200, 'Menge'],
        [460, 200, 'Einzelpreis'],
        [550, 200, 'Gesamt'],
        [380, 220, '480'],
        [460, 220, '2,50'],
        [550, 220, '1.200,00'],
        [380, 236, '1'],
        [460, 236, '15,00'],
        [550, 236, '15,00'],
        [550, 270, '1.215,00'],
        [550, 286, '230,85'],
        [550, 302, '1.445,85'],
      ],
    },
  );

/** In the words of a mail. */
export const MAIL = `Example Plating Co.
14 March 2026

Invoice 88-41 for your order PO-5002

40 pcs 20-777 @ 1.25 = 50.00
Minimum lot charge        25.00
Certs                     12.50

Total                  $  87.50

Payable within 30 days. Thank you.
`;

/** A boxed form: labels over their values. */
export const boxed = () =>
  pdfOf(
    [
      [50, 50, 'Northside NDT Ltd.'],
      [50, 90, 'Invoice Number'],
      [180, 90, 'Date'],
      [300, 90, 'Customer PO'],
      [430, 90, 'Due Date'],
      [50, 104, 'N-7731'],
      [180, 104, '2026-03-14'],
      [300, 104, '5003'],
      [430, 104, '2026-04-01'],
      [50, 150, 'QTY'],
      [110, 150, 'DESCRIPTION'],
      [50, 168, '5'],
      [110, 168, 'FPI of 30-415 Rev B per ASTM E1417'],
      [50, 184, '1'],
      [110, 184, 'Rush charge'],
      [380, 230, 'Shipping'],
      [380, 246, 'Total (GBP)'],
    ],
    {
      right: [
        [430, 150, 'RATE'],
        [540, 150, 'AMOUNT'],
        [430, 168, '20.00'],
        [540, 168, '100.00'],
        [430, 184, '35.00'],
        [540, 184, '35.00'],
        [540, 230, '8.00'],
        [540, 246, '143.00'],
      ],
    },
  );

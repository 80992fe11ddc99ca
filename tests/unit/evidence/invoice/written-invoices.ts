/** Invoices as plain text, each with what is to be read from it. None of them is a layout that the reading knows. */
export const WRITTEN: readonly { readonly text: string; readonly truth: object }[] = [
  {
    text: `
                          PRECISION FINISHING LLC
   BILL TO: Falcon Shop                     Invoice #: 0004471
   1 Main St                                Date: 3/18/26
                                            PO #: 5002
                                            Due: Upon receipt

   QTY   PART NO.      DESCRIPTION                    PRICE     EXT. PRICE
   ---   --------      ---------------------------    -----     ----------
    40   20-777        CAD PLATE PER AMS-QQ-P-416     1.2500         50.00
                       TYPE II CL 2
                       LOT MINIMUM                                   75.00
                       CERT CHARGE                                   12.50

                                              SUBTOTAL              137.50
                                              TAX (0.00%)             0.00
                                              TOTAL                 137.50
   Wire to: First Bank  ABA 021000021  Acct 123456789
`,
    truth: {
      invoice_number: '0004471',
      invoice_date: '2026-03-18',
      purchase_order: '5002',
      currency: null,
      lines: [{ part_number: '20-777', qty: 40, unit_price: 1.25, amount: 50 }],
      lot_minimum_adjustment: 75,
      certification_fee: 12.5,
      total: 137.5,
      due_date: '2026-03-18',
      bank: { iban: null, account: '123456789', routing: '021000021', swift: null },
    },
  },
  {
    text: `
FACTURE N° F-2026-089
Date : 14/03/2026         Échéance : 13/04/2026
Votre commande : PO-5003
Désignation                 Réf.       Qté     P.U. HT     Montant HT
Ressuage                    30-415       5      20,00         100,00
Certificat                               1      15,00          15,00
                                            Total HT          115,00
                                            TVA 20 %           23,00
                                            Total TTC         138,00 €
IBAN : FR76 3000 6000 0112 3456 7890 189   BIC : AGRIFRPPXXX
`,
    truth: {
      invoice_number: 'F-2026-089',
      invoice_date: '2026-03-14',
      purchase_order: 'PO-5003',
      currency: 'EUR',
      lines: [{ part_number: '30-415', qty: 5, unit_price: 20, amount: 100 }],
      certification_fee: 15,
      tax: 23,
      tax_rate: 20,
      subtotal: 115,
      total: 138,
      due_date: '2026-04-13',
      bank: { iban: 'FR76 3000 6000 0112 3456 7890 189', account: null, routing: null, swift: 'AGRIFRPPXXX' },
    },
  },
  {
    text: `
INVOICE
Invoice Number: HT-2231     Invoice Date: March 14, 2026     Page 1 of 1
Purchase Order: PO-5001     Packing slip: 88121              Net 45
Customer: Falcon Shop

Line  Part Number / Rev   Qty Shipped  UOM  Unit Price  Extended
1     10-200 / A          12           EA   2.40        28.80
2     10-311 / C          8            EA   2.40        19.20
      Minimum charge adjustment                         52.00
      Certification fee                                 15.00
      Freight                                            9.85

                                     Sales Tax           0.00
                                     Invoice Total     124.85 USD
`,
    truth: {
      invoice_number: 'HT-2231',
      invoice_date: '2026-03-14',
      purchase_order: 'PO-5001',
      currency: 'USD',
      lines: [
        { part_number: '10-200', qty: 12, unit_price: 2.4, amount: 28.8 },
        { part_number: '10-311', qty: 8, unit_price: 2.4, amount: 19.2 },
      ],
      lot_minimum_adjustment: 52,
      certification_fee: 15,
      freight: 9.85,
      tax: 0,
      total: 124.85,
      due_date: '2026-04-28',
    },
  },
  {
    text: `
Thank you for your business!
Tax Invoice 10045
Issued 14-Mar-2026, payment due 30 days net
Order number 5001
10-200   12 off   at £2.50 each    £30.00
10-311    8 off   at £2.50 each    £20.00
Minimum order charge               £50.00
C of C                             £10.00
VAT @ 20%                          £22.00
Amount due                        £132.00
Sort code 20-00-00  Account number 12345678
`,
    truth: {
      invoice_number: '10045',
      invoice_date: '2026-03-14',
      purchase_order: '5001',
      currency: 'GBP',
      lines: [
        { part_number: '10-200', qty: 12, unit_price: 2.5, amount: 30 },
        { part_number: '10-311', qty: 8, unit_price: 2.5, amount: 20 },
      ],
      lot_minimum_adjustment: 50,
      certification_fee: 10,
      tax: 22,
      tax_rate: 20,
      total: 132,
      due_date: '2026-04-13',
      bank: { iban: null, account: '12345678', routing: '20-00-00', swift: null },
    },
  },
  {
    text: `
Example Thermal, Inc.                                  INVOICE
                                                       No. 5512
                                                       Date 3/14/2026
Sold To: Falcon Shop
Order: PO-5001    Ship Date: 3/12/2026    Terms: Net 30 days

Part            Rev   Ordered   Shipped   Price Each   Total
10-200          A          12        11       $2.50    $27.50
10-311          C           8         8       $2.50    $20.00
Solution heat treat and age per AMS 2770 Rev R, 2024-O to T42
Lot charge minimum $100.00 - adjustment                $52.50
Certs                                                  $10.00
                                    Shipping            $0.00
                                    Tax                 $0.00
                                    Balance Due       $110.00
NOTE: our bank has changed. New account number 99887766, routing 011000015.
`,
    truth: {
      invoice_number: '5512',
      invoice_date: '2026-03-14',
      purchase_order: 'PO-5001',
      lines: [
        { part_number: '10-200', qty: 11, unit_price: 2.5, amount: 27.5 },
        { part_number: '10-311', qty: 8, unit_price: 2.5, amount: 20 },
      ],
      lot_minimum_adjustment: 52.5,
      certification_fee: 10,
      total: 110,
      due_date: '2026-04-13',
      bank: { iban: null, account: '99887766', routing: '011000015', swift: null },
    },
  },
  {
    text: `
From: billing@example.com
Subject: Invoice INV-00123 / PO 5001

Please find our invoice INV-00123 dated 14 March 2026 for PO-5001:

  10-200 rev A: 12 pieces x $2.50 = $30.00
  10-311 rev C: 8 pieces x $2.50 = $20.00
  Lot minimum adjustment: $50.00
  Certification: $10.00
  Total due: $110.00 by April 13, 2026.
`,
    truth: {
      invoice_number: 'INV-00123',
      invoice_date: '2026-03-14',
      lines: [
        { part_number: '10-200', qty: 12, unit_price: 2.5, amount: 30 },
        { part_number: '10-311', qty: 8, unit_price: 2.5, amount: 20 },
      ],
      lot_minimum_adjustment: 50,
      certification_fee: 10,
      total: 110,
      due_date: '2026-04-13',
    },
  },
  {
    text: `
ACME PLATING COMPANY                         Statement / Invoice
                                             Inv. #  A-90021
                                             Inv. Date  Mar 18, 2026
                                             Customer P.O.  PO-5002
                                             Job No.  77123
Cust P/N     Description            Ship Qty    Price/Ea    Line Total
20-777-B     Cad plate II/2             40        $1.25        $50.00
             Lot Min.                    1       $50.00        $50.00
             Cert.                       1       $12.50        $12.50
Sub-Total $112.50    Freight $14.20    Tax $0.00    Total $126.70
Please pay by 17 April 2026
`,
    truth: {
      invoice_number: 'A-90021',
      invoice_date: '2026-03-18',
      lines: [{ part_number: '20-777-B', qty: 40, unit_price: 1.25, amount: 50 }],
      lot_minimum_adjustment: 50,
      certification_fee: 12.5,
      freight: 14.2,
      subtotal: 112.5,
      total: 126.7,
      due_date: '2026-04-17',
    },
  },
  {
    text: `
Invoice number      000871
Invoice date        2026-03-14
PO number           PO-5003
Payment terms       30 days
Currency            USD

Description                              Amount
FPI, 5 pcs P/N 30-415, ASTM E1417        100.00
Cert                                      10.00
Total                                    110.00
`,
    truth: {
      invoice_number: '000871',
      purchase_order: 'PO-5003',
      currency: 'USD',
      lines: [{ part_number: '30-415', qty: 5, unit_price: null, amount: 100 }],
      certification_fee: 10,
      total: 110,
      due_date: '2026-04-13',
    },
  },
  {
    text: `
INVOICE                      Number: 4410
Date: 14.03.26
Order: PO 5001
Part: 10-200   Qty: 12   Unit price: $2.50   Total: $30
Part: 10-311   Qty: 8    Unit price: $2.50   Total: $20
Minimum lot charge: $50
Certification: $10
Amount due: $110
`,
    truth: {
      invoice_number: '4410',
      invoice_date: '2026-03-14',
      lines: [
        { part_number: '10-200', qty: 12, unit_price: 2.5, amount: 30 },
        { part_number: '10-311', qty: 8, unit_price: 2.5, amount: 20 },
      ],
      lot_minimum_adjustment: 50,
      certification_fee: 10,
      total: 110,
    },
  },
  {
    text: `
REMIT TO: Great Lakes NDT, PO Box 99, Erie PA
INVOICE NO.     INVOICE DATE     CUSTOMER P.O.     TERMS        DUE DATE
GL-5519         03/14/2026       PO-5003           NET 30       04/13/2026

QTY ORD   QTY SHIP   PART NUMBER / DESCRIPTION          UNIT PRICE      EXTENSION
5         5          30-415                              20.0000         100.00
                     FLUORESCENT PENETRANT INSPECTION
                     TYPE I METHOD A
                                                        NET AMOUNT      100.00
                                                        CERT FEE         10.00
                                                        FREIGHT           0.00
                                                        SALES TAX         0.00
                                                        INVOICE TOTAL   110.00
`,
    truth: {
      invoice_number: 'GL-5519',
      invoice_date: '2026-03-14',
      purchase_order: 'PO-5003',
      lines: [{ part_number: '30-415', qty: 5, unit_price: 20, amount: 100 }],
      certification_fee: 10,
      subtotal: 100,
      total: 110,
      due_date: '2026-04-13',
    },
  },
  {
    text: `
Galvano Nord AG, Zürich
RECHNUNG
Rechnungs-Nr.: GN 26/0815              Datum: 14. März 2026
Bestell-Nr. PO-5002                    Zahlungsziel: 30 Tage netto
Artikel-Nr.   Bezeichnung     Menge  Einheit  Preis/Stk  Betrag CHF
20-777        Kadmieren       40     Stk      1.25       50.00
Mindestmengenzuschlag                                    1'950.00
Prüfzeugnis                                              12.50
Porto                                                    9.00
Total exkl. MwSt                                         2'021.50
MwSt 8.1%                                                163.74
Total CHF                                                2'185.24
`,
    truth: {
      invoice_number: 'GN 26/0815',
      invoice_date: '2026-03-14',
      purchase_order: 'PO-5002',
      currency: 'CHF',
      lines: [{ part_number: '20-777', qty: 40, unit_price: 1.25, amount: 50 }],
      lot_minimum_adjustment: 1950,
      certification_fee: 12.5,
      freight: 9,
      tax: 163.74,
      tax_rate: 8.1,
      subtotal: 2021.5,
      total: 2185.24,
      due_date: '2026-04-13',
    },
  },
];

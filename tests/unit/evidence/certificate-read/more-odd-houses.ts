import type { House } from './told';

/** Certificates as houses of all kinds might write them, and what they say. */
export const MORE_ODD_HOUSES: readonly House[] = [
  {
    name: 'side blocks',
    page: `
                                                          Form QF-12 Rev. 4
SUNDIAL HEAT TREATING, INC.                               Page 1 of 1
9 Harbour Lane * Wichita, KS 67202

Bill To:                          Ship To:
Wren Aircraft Parts               Wren Aircraft Parts
200 Hangar Way                    200 Hangar Way, Dock 3

Certification of Heat Treatment
Shop Order: 88-1209               Certificate: 88-1209-1
Customer PO: 4588712              Date Completed: 03/09/2026
Customer Batch: B-0188            Certified: 03/11/2026

Qty   Part Number   Rev   Description   Material             Heat/Lot No.
24    10-511        B     BRACKET       2024-O SHEET 0.050   L90
                          Accepted: 24   Rejected: 0

Process Requirements: AMS 2770 Rev. R - Solution treat and naturally age 2024-O to 2024-T42
Equipment: Furnace FN-04 (Class 2, Type B)

Solution Treat:   Set 920F   Load in 03/04/2026 09:12   Soak start 03/04/2026 09:25   Soak end 03/04/2026 10:05   Soak 40 min
Quench:           Water at 72F   Delay 6 sec
Natural Age:      Start 03/04/2026 10:05   End 03/08/2026 10:05   96 hrs

Test Results:     Hardness HRB    70, 71, 71.5   (Req: 63 min)
                  Conductivity    30.2 30.4 %IACS (Req: 28.5-32.5)

CERTIFIED BY: /s/ Lena Brandt        TITLE: Quality Manager
We certify that these parts were processed to the requirements stated above.
`,
    told: `
processor: SUNDIAL HEAT TREATING, INC.
certificate_number: 88-1209-1
certificate_date: 2026-03-11
purchase_order: 4588712
batch: B-0188
process: solution_heat_treat_and_age
specification: AMS 2770
specification_revision: R
class_type: 2024-O to 2024-T42
quench_delay_s: 6
plating_end: null
bake_start: null
bake_end: null
signature_present: true
conformance_statement: true
part | 10-511 | B | 24 | 0 | 2024-O SHEET 0.050 | L90
cycle | solution | 920 | F | 2026-03-04T09:25 | 2026-03-04T10:05 | 40
cycle | natural_age | - | - | 2026-03-04T10:05 | 2026-03-08T10:05 | 5760
readings | hardness | HRB | 70, 71, 71.5
readings | conductivity | %IACS | 30.2, 30.4
`,
  },
  {
    name: 'readings per specimen',
    page: `
Corran Thermal
Test & Treatment Certificate 26-7781 - 12 March 2026
PO 26-PO-5521 / Batch B-0119

Part: WA4410-1 Rev A    Qty: 15 accepted, 0 rejected    Lot: H300-1    Matl: 4130 STEEL
Spec: AMS 2759/1 Rev G

CYCLE DATA
                Austenitize           Temper
Set temp        1575°F                900°F
Charged         09 Mar 2026 06:10     09 Mar 2026 09:30
Discharged      09 Mar 2026 07:20     09 Mar 2026 11:35
Time at temp    70 min                125 min
Quench: oil, 9 s

HARDNESS SURVEY
Specimen   Reading (HRC)
1          37.0
2          37.5
3          36.5
Average    37.0

This certifies that the product meets the specification.
Signature: Paul Okafor (electronic signature)
`,
    told: `
processor: Corran Thermal
certificate_number: 26-7781
certificate_date: 2026-03-12
purchase_order: 26-PO-5521
batch: B-0119
process: harden_and_temper
specification: AMS 2759/1
specification_revision: G
class_type: null
quench_delay_s: 9
plating_end: null
bake_start: null
bake_end: null
signature_present: true
conformance_statement: true
part | WA4410-1 | A | 15 | 0 | 4130 STEEL | H300-1
cycle | austenitize | 1575 | F | 2026-03-09T06:10 | 2026-03-09T07:20 | 70
cycle | temper | 900 | F | 2026-03-09T09:30 | 2026-03-09T11:35 | 125
readings | hardness | HRC | 37, 37.5, 36.5
`,
  },
  {
    name: 'results table 3 cols',
    page: `
PINECREST PLATING & COATINGS LLC
CERTIFICATE OF COMPLIANCE

Cert#: PP-4471          P.O.#: PO-3390          Rel. Date: 10-Mar-2026
Batch#: B-0612          S.O.#: 77120

Process(es): Cadmium Plate, Type II, Class 2, AMS-QQ-P-416 Rev. F, w/ embrittlement relief

P/N            REV   LOT#     QTY   ACC   REJ   COMMENTS
LR7712-2       A     55120    30    30    0     -
LR7713-2       C     55120    12    11    1     1 pc dented

Material: 4340 STEEL

Item                         Requirement              Actual
Plating completed            -                        03/05/26 1:25 PM
Bake within                  4 hours                  2.1 hours
Bake temperature             375 +/- 25 F             380 F
Bake start / stop            -                        03/05/26 3:30 PM / 03/06/26 3:00 PM
Bake time                    23 hours min             23.5 hours
Thickness                    0.0003 - 0.0005 in       0.00041, 0.00043, 0.00040 in
Adhesion                     No peeling               Pass

The above parts have been processed per, and conform to, the above specifications.
Authorized: /s/ M. Voss
`,
    told: `
processor: PINECREST PLATING & COATINGS LLC
certificate_number: PP-4471
certificate_date: 2026-03-10
purchase_order: PO-3390
batch: B-0612
process: cadmium_plate
specification: AMS-QQ-P-416
specification_revision: F
class_type: Type II Class 2
quench_delay_s: null
plating_end: 2026-03-05T13:25
bake_start: 2026-03-05T15:30
bake_end: 2026-03-06T15:00
signature_present: true
conformance_statement: true
part | LR7712-2 | A | 30 | 0 | 4340 STEEL | 55120
part | LR7713-2 | C | 11 | 1 | 4340 STEEL | 55120
cycle | embrittlement_relief | 380 | F | 2026-03-05T15:30 | 2026-03-06T15:00 | 1410
readings | thickness | in | 0.00041, 0.00043, 0.0004
`,
  },
  {
    name: 'numbered paragraphs',
    page: `
OXBOW THERMAL PROCESSING LLC
Quality Certificate
 1. Certificate number: OTP-1190, dated 11 MAR 2026.
 2. Purchaser: Dunmore Aero LLC; purchase order P88120; purchaser's batch B-0900.
 3. Articles: 10-404 Rev. C, 28 pieces received, 28 accepted, 0 rejected; lot L19; material 6061-O SHEET 0.032.
 4. Specification: AMS 2770, Revision R. Condition 6061-O to 6061-T62.
 5. Solution heat treatment: set point 985 °F; soak from 2026-03-07 08:00 to 2026-03-07 08:40 (40 minutes).
 6. Quench: cold water; delay 5 seconds.
 7. Artificial ageing: set point 350 °F; soak from 2026-03-07 10:00 to 2026-03-07 18:00 (8 hours).
 8. Hardness: 54.0, 54.5, 55.0 HRB. Conductivity: 42.0, 42.2 % IACS.
 9. We certify that the articles conform to the specification and the order.
10. Signed for the company: /s/ R. Marlow, Quality Manager.
`,
    told: `
processor: OXBOW THERMAL PROCESSING LLC
certificate_number: OTP-1190
certificate_date: 2026-03-11
purchase_order: P88120
batch: B-0900
process: solution_heat_treat_and_age
specification: AMS 2770
specification_revision: R
class_type: 6061-O to 6061-T62
quench_delay_s: 5
plating_end: null
bake_start: null
bake_end: null
signature_present: true
conformance_statement: true
part | 10-404 | C | 28 | 0 | 6061-O SHEET 0.032 | L19
cycle | solution | 985 | F | 2026-03-07T08:00 | 2026-03-07T08:40 | 40
cycle | artificial_age | 350 | F | 2026-03-07T10:00 | 2026-03-07T18:00 | 480
readings | hardness | HRB | 54, 54.5, 55
readings | conductivity | %IACS | 42, 42.2
`,
  },
  {
    name: 'spanish',
    page: `
Galvánica Tarn Valley S.L.
CERTIFICADO DE CONFORMIDAD N.º 26-0087          Fecha: 11/03/2026
Cliente: Wren Aircraft Parts     Pedido del cliente: PO-8812     Lote cliente: B-0431
Pieza n.º 20-334   Rev. A    Material: 4130 STEEL   Lote material: L66
Cantidad aceptada: 50   Cantidad rechazada: 0
Tratamiento: Cincado electrolítico según ASTM B633-19 Tipo II SC 3
Fin del cincado: 09/03/2026 10:20
Deshidrogenado: 190 °C   Inicio: 09/03/2026 12:00   Fin: 10/03/2026 11:30   Duración: 23,5 h
Espesor: 15,2; 16,0; 15,6 µm
Certificamos que las piezas cumplen con los requisitos del pedido.
Firmado digitalmente por: Ana Ruiz
`,
    told: `
processor: Galvánica Tarn Valley S.L.
certificate_number: 26-0087
certificate_date: 2026-03-11
purchase_order: PO-8812
batch: B-0431
process: zinc_plate
specification: ASTM B633
specification_revision: 19
class_type: Type II SC 3
quench_delay_s: null
plating_end: 2026-03-09T10:20
bake_start: 2026-03-09T12:00
bake_end: 2026-03-10T11:30
signature_present: true
conformance_statement: true
part | 20-334 | A | 50 | 0 | 4130 STEEL | L66
cycle | embrittlement_relief | 190 | C | 2026-03-09T12:00 | 2026-03-10T11:30 | 1410
readings | thickness | µm | 15.2, 16, 15.6
`,
  },
  {
    name: 'time table with dates apart',
    page: `
BELMORE HEAT TREAT CO. - FURNACE RECORD & CERT
Cert No 99120   Cust Order P55120   Dated 3/10/2026   Batch B-0710

Part        10-900-1      Chg  B
Lot         L4            Alloy 7075-O SHEET 0.040
Accept      75            Reject 0

HT Spec AMS 2770 / R      Temper: 7075-O to 7075-T62

Furn   Oper       Date      In      Out     Set   Min
2      SHT        3/6/26    0830    0910    900   40
4      AGE        3/6/26    1000    1000*   250   1440
* following day

Quench H2O   Delay 7s
RB 87 88 88      COND 33.0 33.1

Certified true: heat treated IAW above specification and found to conform.
/s/ T. J. Whitfield QA
`,
    told: `
processor: BELMORE HEAT TREAT CO.
certificate_number: 99120
certificate_date: 2026-03-10
purchase_order: P55120
batch: B-0710
process: solution_heat_treat_and_age
specification: AMS 2770
specification_revision: R
class_type: 7075-O to 7075-T62
quench_delay_s: 7
plating_end: null
bake_start: null
bake_end: null
signature_present: true
conformance_statement: true
part | 10-900-1 | B | 75 | 0 | 7075-O SHEET 0.040 | L4
cycle | solution | 900 | - | 2026-03-06T08:30 | 2026-03-06T09:10 | 40
cycle | artificial_age | 250 | - | 2026-03-06T10:00 | 2026-03-07T10:00 | 1440
readings | hardness | HRB | 87, 88, 88
readings | conductivity | - | 33, 33.1
`,
  },
  {
    name: 'parts list with dashes',
    page: `
NORTHGATE ANODIZING CO.
C E R T I F I C A T I O N
Cert. Ref.: NA/2026/118
Cert. Date: 9 Mar 26
Your Order: 4599102
Your Ref: B-0266

We certify that the undermentioned parts have been treated in accordance with your order:

  Part No 20-118 Issue B, Bracket, material 7075-T6 BAR, lot 90115 - qty 14 (accepted 14, rejected nil)
  Part No 20-119 Issue A, Clip, material 7075-T6 BAR, lot 90116 - qty 9 (accepted 9, rejected nil)

Treatment: Sulphuric anodise to MIL-PRF-8625 Rev F Type II Class 1
Film thickness: 12.0, 11.5, 12.5 microns

Inspected by: [stamp NA 7]     Released by: /s/ P. Okafor
`,
    told: `
processor: NORTHGATE ANODIZING CO.
certificate_number: NA/2026/118
certificate_date: 2026-03-09
purchase_order: 4599102
batch: B-0266
process: anodize
specification: MIL-PRF-8625
specification_revision: F
class_type: Type II Class 1
quench_delay_s: null
plating_end: null
bake_start: null
bake_end: null
signature_present: true
conformance_statement: true
part | 20-118 | B | 14 | 0 | 7075-T6 BAR | 90115
part | 20-119 | A | 9 | 0 | 7075-T6 BAR | 90116
readings | thickness | µm | 12, 11.5, 12.5
`,
  },
  {
    name: 'email',
    page: `
From: certs@corran.example
To: receiving@wren.example
Subject: Certification for PO-7781

Hi Ana,

cert data for batch B-0330 as requested, original follows by post.

Cert #      : 26-5518
Issued      : 12 Mar 2026
Your PO     : PO-7781
Part        : KF1180-3 rev D
Qty OK/NOK  : 26/2
Matl / lot  : 4130 STEEL / H441-2
Treatment   : stress relief, AMS 2759/11 rev D
Furnace run : 1100 F, in 10 Mar 2026 07:30, out 10 Mar 2026 09:35 (125 min)

We certify that the parts meet the requirements of the specification.

Electronically signed
Maren Voss
`,
    told: `
processor: null
certificate_number: 26-5518
certificate_date: 2026-03-12
purchase_order: PO-7781
batch: B-0330
process: stress_relief
specification: AMS 2759/11
specification_revision: D
class_type: null
quench_delay_s: null
plating_end: null
bake_start: null
bake_end: null
signature_present: true
conformance_statement: true
part | KF1180-3 | D | 26 | 2 | 4130 STEEL | H441-2
cycle | stress_relief | 1100 | F | 2026-03-10T07:30 | 2026-03-10T09:35 | 125
`,
  },
  {
    name: 'transposed parts table',
    page: `
Halvard Testing Laboratory
FPI INSPECTION RECORD          Record No. HL-1182     Issue date 2026-03-11
Purchase order no. P30912      Cust. batch B-0512

                       Item 1          Item 2
Part number            10-118          10-119
Revision               B               A
Material               7075-T6 BAR     7075-T6 BAR
Lot                    L81             L82
Quantity accepted      20              31
Quantity rejected      0               1

Specification          ASTM E1417-21
Type / Method / Level  I / C / 3

Result: no rejectable indications on accepted parts.
I certify that inspection was performed in accordance with the specification.
Inspector: Ines Calder, NAS 410 Level 2       /s/ I. Calder
`,
    told: `
processor: Halvard Testing Laboratory
certificate_number: HL-1182
certificate_date: 2026-03-11
purchase_order: P30912
batch: B-0512
process: fluorescent_penetrant
specification: ASTM E1417
specification_revision: 21
class_type: Type I Method C Level 3
quench_delay_s: null
plating_end: null
bake_start: null
bake_end: null
signature_present: true
conformance_statement: true
part | 10-118 | B | 20 | 0 | 7075-T6 BAR | L81
part | 10-119 | A | 31 | 1 | 7075-T6 BAR | L82
`,
  },
  {
    name: 'two tables of parts',
    page: `
MARLIN BAY METAL FINISHING, INC.       CERTIFICATE NUMBER 118-26-7
                                       CERTIFICATE DATE   03/12/2026
CUSTOMER P.O.  PO-26-441               BATCH NUMBER       B-0091

LINE   PART NUMBER    REV   MATERIAL
1      118330-11      C     304 STAINLESS
2      118331-11      A     304 STAINLESS

LINE   PART NUMBER    LOT      RECEIVED   ACCEPTED   REJECTED
1      118330-11      H22-1    40         40         0
2      118331-11      H22-1    18         18         0

PROCESS: PASSIVATION PER AMS 2700 REV F METHOD 1 TYPE 2
CERTIFICATION: THE ABOVE LISTED PARTS WERE PROCESSED TO AND MEET THE ABOVE SPECIFICATION.
AUTHORIZED SIGNATURE: /S/ D. QUINLAN
`,
    told: `
processor: MARLIN BAY METAL FINISHING, INC.
certificate_number: 118-26-7
certificate_date: 2026-03-12
purchase_order: PO-26-441
batch: B-0091
process: passivation
specification: AMS 2700
specification_revision: F
class_type: Method 1 Type 2
quench_delay_s: null
plating_end: null
bake_start: null
bake_end: null
signature_present: true
conformance_statement: true
part | 118330-11 | C | 40 | 0 | 304 STAINLESS | H22-1
part | 118331-11 | A | 18 | 0 | 304 STAINLESS | H22-1
`,
  },
  {
    name: 'prose bake',
    page: `
Tarn Valley Plating Works
Certificate of Conformance TV-5512          Date: March 11, 2026
Reference: Purchase Order PO-4410, Batch B-0551

This is to certify that the parts listed below were zinc plated in accordance with
ASTM B633-19, Type II, SC 3.

Part Number: LR5510-4       Revision: B
Quantity: 33                Rejected: 0
Lot Number: 70119           Base Material: 4130 STEEL

Parts left the plating tank on March 8, 2026 at 9:40 AM and entered the bake oven on
March 8, 2026 at 12:15 PM. They were held at 375°F and removed from the oven on
March 9, 2026 at 11:45 AM after 23.5 hours. The coating thickness measured 0.62, 0.66
and 0.64 mils at three locations.

Respectfully,
/s/ Ines Calder
Quality Manager
`,
    told: `
processor: Tarn Valley Plating Works
certificate_number: TV-5512
certificate_date: 2026-03-11
purchase_order: PO-4410
batch: B-0551
process: zinc_plate
specification: ASTM B633
specification_revision: 19
class_type: Type II SC 3
quench_delay_s: null
plating_end: 2026-03-08T09:40
bake_start: 2026-03-08T12:15
bake_end: 2026-03-09T11:45
signature_present: true
conformance_statement: true
part | LR5510-4 | B | 33 | 0 | 4130 STEEL | 70119
cycle | embrittlement_relief | 375 | F | 2026-03-08T12:15 | 2026-03-09T11:45 | 1410
readings | thickness | mil | 0.62, 0.66, 0.64
`,
  },
  {
    name: 'dutch nordic',
    page: `
Kestrel Hill Surface Technologies Ltd
Sertifikat / Certificate   KH-2207          Dato / Date   11.03.2026
Ordre nr. / PO             PO-9921          Batch         B-0704
Delenummer / Part no.      30-118           Rev.          B
Antall godkjent / Accepted 16               Kassert / Rejected  0
Materiale / Material       7075-T6 BAR      Parti / Lot   90020
Prosess / Process          Chemical film    Spesifikasjon / Specification   MIL-DTL-5541 Rev F
Type / Class               Type II Class 3
We hereby certify that the goods comply with the order.
Signert elektronisk: Nina Dahl
`,
    told: `
processor: Kestrel Hill Surface Technologies Ltd
certificate_number: KH-2207
certificate_date: 2026-03-11
purchase_order: PO-9921
batch: B-0704
process: chemical_film
specification: MIL-DTL-5541
specification_revision: F
class_type: Type II Class 3
quench_delay_s: null
plating_end: null
bake_start: null
bake_end: null
signature_present: true
conformance_statement: true
part | 30-118 | B | 16 | 0 | 7075-T6 BAR | 90020
`,
  },
  {
    name: 'step per line',
    page: `
Belmore Thermal
CERT OF HEAT TREAT   NO. 7781-A     DATE 3-11-26
CUSTOMER Lowell Rotor Works         PO PO-1190  BATCH B-0615
PART WA9002-3 REV C                 QTY 60 PCS   LOT L500   MAT'L 4130 STEEL
ACC 60 REJ 0

AUST:    1575 F  65 MIN    IN 3-9-26 7:00A    OUT 3-9-26 8:05A
QUENCH:  OIL     120 F     DELAY 8 SEC
TEMPER:  925 F   2 HR      IN 3-9-26 10:00A   OUT 3-9-26 12:00P
HARDNESS: RC 36, 36, 37 (SPEC 34-38)

PER AMS 2759/1G. PARTS CONFORM TO ALL REQUIREMENTS OF THE PO AND SPEC.
X /s/ R. Marlow
`,
    told: `
processor: Belmore Thermal
certificate_number: 7781-A
certificate_date: 2026-03-11
purchase_order: PO-1190
batch: B-0615
process: harden_and_temper
specification: AMS 2759/1
specification_revision: G
class_type: null
quench_delay_s: 8
plating_end: null
bake_start: null
bake_end: null
signature_present: true
conformance_statement: true
part | WA9002-3 | C | 60 | 0 | 4130 STEEL | L500
cycle | austenitize | 1575 | F | 2026-03-09T07:00 | 2026-03-09T08:05 | 65
cycle | temper | 925 | F | 2026-03-09T10:00 | 2026-03-09T12:00 | 120
readings | hardness | HRC | 36, 36, 37
`,
  },
];

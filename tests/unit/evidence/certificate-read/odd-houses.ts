import type { House } from './told';

/** Certificates as houses of all kinds might write them, and what they say. */
export const ODD_HOUSES: readonly House[] = [
  {
    name: 'plater log',
    page: `
BELMORE PLATING WORKS                                   CERT OF PROCESS
14 Mill Lane, Dayton OH 45402   Ph 937-555-0142
CUST: Wren Aircraft Parts      CUST PO: PO-7731      CERT: 26-1188
DATE SHIPPED: 03/06/26   CERT DATE: 03/05/26         BATCH: B-0042

PN: 20-777   REV: C   QTY: 40 EA   MATL: 4340 STEEL   LOT: H12
SPEC: AMS-QQ-P-416F TYPE II CL 2
REJECTS: 0

OP   DESCRIPTION                        DATE       TIME ON   TIME OFF   BY
10   ALKALINE CLEAN                     03/03/26   07:10     07:30      JM
20   CADMIUM PLATE TANK 4               03/03/26   08:15     09:40      RT
30   EMBRITTLEMENT RELIEF BAKE 375F     03/03/26   11:05     10:20      RT
40   SUPPLEMENTARY CHROMATE             03/04/26   11:00     11:05      JM

THICKNESS READINGS (INCHES): .00042, .00045, .00043
I CERTIFY THE ABOVE WORK WAS DONE PER THE SPEC AND MEETS ITS REQUIREMENTS.
/S/ R. TULLY
`,
    told: `
processor: BELMORE PLATING WORKS
certificate_number: 26-1188
certificate_date: 2026-03-05
purchase_order: PO-7731
batch: B-0042
process: cadmium_plate
specification: AMS-QQ-P-416
specification_revision: F
class_type: Type II Class 2
quench_delay_s: null
plating_end: 2026-03-03T09:40
bake_start: 2026-03-03T11:05
bake_end: 2026-03-04T10:20
signature_present: true
conformance_statement: true
part | 20-777 | C | 40 | 0 | 4340 STEEL | H12
cycle | embrittlement_relief | 375 | F | 2026-03-03T11:05 | 2026-03-04T10:20 | 1395
readings | thickness | in | 0.00042, 0.00045, 0.00043
`,
  },
  {
    name: 'spec actual',
    page: `
Tarn Valley Thermal LLC
HEAT TREAT CERTIFICATION

Certification #  HT-3391                     Date of certification  12-MAR-2026
Purchase Order   45-1190                     Batch #                B-0107
P/N              DX4410-2                    Rev                    D
Qty Submitted    36                          Qty Accepted           35
Qty Rejected     1                           Lot No                 L220
Material         6061-O SHEET 0.050          Process Spec           AMS2770 REV R
Temper In        O                           Temper Out             T62

                       SPECIFIED         ACTUAL
Solution Temp          975-995 F         985 F
Solution Soak          30-60 min         41 min
Time in furnace                          03/09/2026 07:55
Time out of furnace                      03/09/2026 08:36
Quench delay           10 sec max        6 sec
Quench media           Water             Water
Age Temp               340-360 F         350 F
Age Time               8 hrs min         8.25 hrs
Age In                                   03/09/2026 10:00
Age Out                                  03/09/2026 18:15
Hardness               47 HRB min        53, 54, 52 HRB
Conductivity           40.0 - 45.0       42.1, 42.4 % IACS

All parts have been processed in accordance with the above specification and conform to its requirements.
Electronically signed by: Maren Voss, Lab Supervisor
`,
    told: `
processor: Tarn Valley Thermal LLC
certificate_number: HT-3391
certificate_date: 2026-03-12
purchase_order: 45-1190
batch: B-0107
process: solution_heat_treat_and_age
specification: AMS 2770
specification_revision: R
class_type: 6061-O to 6061-T62
quench_delay_s: 6
plating_end: null
bake_start: null
bake_end: null
signature_present: true
conformance_statement: true
part | DX4410-2 | D | 35 | 1 | 6061-O SHEET 0.050 | L220
cycle | solution | 985 | F | 2026-03-09T07:55 | 2026-03-09T08:36 | 41
cycle | artificial_age | 350 | F | 2026-03-09T10:00 | 2026-03-09T18:15 | 495
readings | hardness | HRB | 53, 54, 52
readings | conductivity | %IACS | 42.1, 42.4
`,
  },
  {
    name: 'boxes checked',
    page: `
KESTREL HILL NDT SERVICES, INC.
NONDESTRUCTIVE INSPECTION REPORT            Report #: FP-20931
                                            Insp. Date: 3/4/26
Client: Dunmore Aero LLC                    Client PO: P44012
Ref Batch: B-0311

Inspection: [X] FPI   [ ] MPI   [ ] UT      Spec: ASTM E1417/E1417M-21e1
Type:  [X] I   [ ] II      Method: [ ] A  [X] C  [ ] D     Sensitivity: [ ] 2  [X] 3  [ ] 4

Part Number    Rev   Material       Lot     Insp'd   Acc   Rej
10-311         C     2024-T3 SHEET  L7      8        8     0
10-312         C     2024-T3 SHEET  L7      14       14    0

Statement: This is to certify that the parts listed were inspected per the specification and found acceptable.
Inspector: D. Quinlan   Level II
Signed: /s/ D. Quinlan           Date: 3/5/26
`,
    told: `
processor: KESTREL HILL NDT SERVICES, INC.
certificate_number: FP-20931
certificate_date: 2026-03-05
purchase_order: P44012
batch: B-0311
process: fluorescent_penetrant
specification: ASTM E1417
specification_revision: 21e1
class_type: Type I Method C Level 3
quench_delay_s: null
plating_end: null
bake_start: null
bake_end: null
signature_present: true
conformance_statement: true
part | 10-311 | C | 8 | 0 | 2024-T3 SHEET | L7
part | 10-312 | C | 14 | 0 | 2024-T3 SHEET | L7
`,
  },
  {
    name: 'german',
    page: `
Halvard Härterei GmbH
Werkszeugnis nach DIN EN 10204 - 2.3

Bescheinigungsnummer   WZ-26-0417          Datum        12.03.2026
Bestellnummer Kunde    PO-26-771           Charge/Batch B-0210
Teilenummer            10-200              Änderungsindex  B
Stückzahl gut          40                  Stückzahl Ausschuss  0
Werkstoff              6061-O SHEET 0.050  Los-Nr.      L55
Prozessvorschrift      AMS 2770 Rev. R     Zustand      6061-O nach T62

Wärmebehandlung
Lösungsglühen   529 °C   Beginn 09.03.2026 08:10   Ende 09.03.2026 08:52   Haltezeit 42 min
Abschrecken     Wasser   Verzögerung 6 s
Warmauslagern   177 °C   Beginn 09.03.2026 11:00   Ende 09.03.2026 19:00   Haltezeit 8 h

Prüfungen
Härte HRB        53,0 / 54,5 / 52,5
Leitfähigkeit    42,1 % IACS

Wir bestätigen, dass die Lieferung den Anforderungen der Bestellung entspricht.
gez. Lena Brandt, Qualitätsleiterin
`,
    told: `
processor: Halvard Härterei GmbH
certificate_number: WZ-26-0417
certificate_date: 2026-03-12
purchase_order: PO-26-771
batch: B-0210
process: solution_heat_treat_and_age
specification: AMS 2770
specification_revision: R
class_type: 6061-O to 6061-T62
quench_delay_s: 6
plating_end: null
bake_start: null
bake_end: null
signature_present: true
conformance_statement: true
part | 10-200 | B | 40 | 0 | 6061-O SHEET 0.050 | L55
cycle | solution | 529 | C | 2026-03-09T08:10 | 2026-03-09T08:52 | 42
cycle | artificial_age | 177 | C | 2026-03-09T11:00 | 2026-03-09T19:00 | 480
readings | hardness | HRB | 53, 54.5, 52.5
readings | conductivity | %IACS | 42.1
`,
  },
  {
    name: 'dense terse',
    page: `
OXBOW METAL FINISHING INC  CERT NBR 118822  DTD 03/11/26
SOLD TO LOWELL ROTOR WORKS  PO NBR PO-8815  REF B-0077
ITEM  P/N         RV  ACC  REJ  HT/LOT   MATL
1     LR2201-3    B   25   0    45512    4130 STEEL
2     LR2202-1    A   25   0    45512    4130 STEEL
ZINC PLATE ASTM B633-19 TY II SC 3
PLT COMPL 03/09/26 1422   BAKE ON 03/09/26 1605  BAKE OFF 03/10/26 1535  23.5 HR @ 375F
THK .0006/.0007/.0006
WE CERTIFY ALL ABOVE CONFORM TO SPEC AND PO.
QA /S/ T J WHITFIELD
`,
    told: `
processor: OXBOW METAL FINISHING INC
certificate_number: 118822
certificate_date: 2026-03-11
purchase_order: PO-8815
batch: B-0077
process: zinc_plate
specification: ASTM B633
specification_revision: 19
class_type: Type II SC 3
quench_delay_s: null
plating_end: 2026-03-09T14:22
bake_start: 2026-03-09T16:05
bake_end: 2026-03-10T15:35
signature_present: true
conformance_statement: true
part | LR2201-3 | B | 25 | 0 | 4130 STEEL | 45512
part | LR2202-1 | A | 25 | 0 | 4130 STEEL | 45512
cycle | embrittlement_relief | 375 | F | 2026-03-09T16:05 | 2026-03-10T15:35 | 1410
readings | thickness | in | 0.0006, 0.0007, 0.0006
`,
  },
  {
    name: 'above labels',
    page: `
PINECREST HEAT TREATING, INC.

CERTIFICATE NO.      ISSUE DATE        CUSTOMER P.O.      BATCH REF.
26-4410              March 12, 2026    PO-9120            B-0099

PART NUMBER          REV               QTY ACC.           QTY REJ.
WA1002-7             E                 18                 0

MATERIAL             HEAT LOT          SPECIFICATION      REVISION
4130 STEEL           72231             AMS 2759/1         G

AUSTENITIZE TEMP     TIME IN           TIME OUT           MINUTES
1575 F               3/9/26 6:40 AM    3/9/26 7:45 AM     65

QUENCHANT            DELAY             TEMPER TEMP        TEMPER MINUTES
Oil                  8 sec             925 F              125

TEMPER IN            TEMPER OUT        HARDNESS           AVG
3/9/26 9:00 AM       3/9/26 11:05 AM   36.0, 36.5, 37.0 HRC   36.5

The undersigned hereby certifies that the above has been heat treated in accordance with the specification.

Signature on file: /s/ Paul Okafor
`,
    told: `
processor: PINECREST HEAT TREATING, INC.
certificate_number: 26-4410
certificate_date: 2026-03-12
purchase_order: PO-9120
batch: B-0099
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
part | WA1002-7 | E | 18 | 0 | 4130 STEEL | 72231
cycle | austenitize | 1575 | F | 2026-03-09T06:40 | 2026-03-09T07:45 | 65
cycle | temper | 925 | F | 2026-03-09T09:00 | 2026-03-09T11:05 | 125
readings | hardness | HRC | 36, 36.5, 37
`,
  },
  {
    name: 'letter 2',
    page: `
Marlin Bay Plating & Coatings LLC
77 Industrial Park Dr, Tulsa, OK 74103

March 9, 2026

Bright River Aviation
Receiving Inspection

Re: Certification 26-0815 for your purchase order number 4512290 (batch B-0450)

Gentlemen,

This is to certify that 22 pieces of part number 118820-14 revision C, manufactured from
lot 88101 of 7075-T6 BAR, were sulfuric acid anodized per MIL-PRF-8625 Revision F, Type II,
Class 1 on March 5, 2026. None were rejected. Coating thickness was checked on three pieces
and found to be 0.00045, 0.00050 and 0.00048 inch.

We hereby certify that the parts meet all requirements of the referenced specification.

Very truly yours,
(signed electronically) Ines Calder
Quality Manager
`,
    told: `
processor: Marlin Bay Plating & Coatings LLC
certificate_number: 26-0815
certificate_date: 2026-03-09
purchase_order: 4512290
batch: B-0450
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
part | 118820-14 | C | 22 | 0 | 7075-T6 BAR | 88101
readings | thickness | in | 0.00045, 0.0005, 0.00048
`,
  },
  {
    name: 'min max avg',
    page: `
Sundial Surface Technologies Ltd
Certificate of Conformity No: SST/26/0551         Issued: 10 March 2026
Order: PO-26-330    Your batch: B-0123
Part: KF3310-4 Issue C    Quantity: 60 off    Rejected: Nil
Material: 4340 STEEL      Cast: 90112
Process: Cadmium plating to AMS-QQ-P-416 Rev F Type I Class 1
Deposit thickness (microinches)   Min 510   Max 560   Mean 532
Plating complete 5 March 2026 at 10:15
De-embrittled at 190°C for 24 hours commencing 5 March 2026 at 12:30 finishing 6 March 2026 at 12:30
The above items conform to the order requirements and specification stated.
For and on behalf of Sundial Surface Technologies Ltd
Digitally signed by Lena Brandt 2026-03-10
`,
    told: `
processor: Sundial Surface Technologies Ltd
certificate_number: SST/26/0551
certificate_date: 2026-03-10
purchase_order: PO-26-330
batch: B-0123
process: cadmium_plate
specification: AMS-QQ-P-416
specification_revision: F
class_type: Type I Class 1
quench_delay_s: null
plating_end: 2026-03-05T10:15
bake_start: 2026-03-05T12:30
bake_end: 2026-03-06T12:30
signature_present: true
conformance_statement: true
part | KF3310-4 | C | 60 | 0 | 4340 STEEL | 90112
cycle | embrittlement_relief | 190 | C | 2026-03-05T12:30 | 2026-03-06T12:30 | 1440
readings | thickness | microinch | 510, 560
`,
  },
  {
    name: 'french',
    page: `
NORTHGATE TRAITEMENTS THERMIQUES SAS
CERTIFICAT DE CONFORMITE N° 26-1190 du 12/03/2026

Client : Wren Aircraft Parts           Commande client : PO-5510
Lot client (batch) : B-0033

Référence pièce : 10-455    Indice : B    Quantité conforme : 16   Quantité rebutée : 0
Matière : 7075-O SHEET 0.063     N° de coulée / lot : L81
Spécification : AMS 2770 Rev R    Etat final : 7075-O vers 7075-T62

Mise en solution : 482 °C, début 09/03/2026 08h05, fin 09/03/2026 08h50, durée 45 min
Trempe : eau, délai 5 s
Revenu (vieillissement) : 121 °C, début 09/03/2026 14h00, fin 10/03/2026 14h00, durée 24 h
Dureté : 87 - 88 - 87 HRB
Conductivité : 32,5 % IACS

Nous certifions que les pièces sont conformes aux exigences de la commande.
Visa qualité : signé électroniquement par J. Martel
`,
    told: `
processor: NORTHGATE TRAITEMENTS THERMIQUES SAS
certificate_number: 26-1190
certificate_date: 2026-03-12
purchase_order: PO-5510
batch: B-0033
process: solution_heat_treat_and_age
specification: AMS 2770
specification_revision: R
class_type: 7075-O to 7075-T62
quench_delay_s: 5
plating_end: null
bake_start: null
bake_end: null
signature_present: true
conformance_statement: true
part | 10-455 | B | 16 | 0 | 7075-O SHEET 0.063 | L81
cycle | solution | 482 | C | 2026-03-09T08:05 | 2026-03-09T08:50 | 45
cycle | artificial_age | 121 | C | 2026-03-09T14:00 | 2026-03-10T14:00 | 1440
readings | hardness | HRB | 87, 88, 87
readings | conductivity | %IACS | 32.5
`,
  },
  {
    name: 'spec for part in row',
    page: `
CORRAN HEAT TREAT CO.                        CERT OF CONFORMANCE
Ship Date: 03/14/26     C of C: CC331-22     Date: 03/13/26
Cust P.O.: PO-6612      Traveler: B-0640

Line  Part/Rev      Spec/Rev      Cond        Matl         Ht/Lot    Rcvd  Acc  Rej
001   10-200/A      AMS2759/11/D  STRESS REL  4130 STEEL   L1        12    12   0
002   10-201/B      AMS2759/11/D  STRESS REL  4130 STEEL   L2        9     9    0

Furnace #3   Load 26-0311-2
Stress Relieve   1100F +/-25   Soak 2 hrs 5 min   In 03/11/26 0815   Out 03/11/26 1020
Air cool

We certify the material listed complies with the specifications and purchase order.
QA Mgr: /s/ R. Marlow
`,
    told: `
processor: CORRAN HEAT TREAT CO.
certificate_number: CC331-22
certificate_date: 2026-03-13
purchase_order: PO-6612
batch: B-0640
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
part | 10-200 | A | 12 | 0 | 4130 STEEL | L1
part | 10-201 | B | 9 | 0 | 4130 STEEL | L2
cycle | stress_relief | 1100 | F | 2026-03-11T08:15 | 2026-03-11T10:20 | 125
`,
  },
  {
    name: 'mpi',
    page: `
Belmore Inspection Labs LLC
MAGNETIC PARTICLE INSPECTION REPORT

MT Report Number .......... MT-5519
Date of Inspection ........ 11 Mar 2026
Report Date ............... 12 Mar 2026
Customer Order ............ P77120
Customer Batch ............ B-0501
Drawing / Part ............ 20-118  Rev. B
Alloy ..................... 4340 STEEL
Heat or Lot ............... L77
Pieces Inspected .......... 30
Pieces Accepted ........... 29
Pieces Rejected ........... 1
Procedure / Specification . ASTM E1444/E1444M-22a
Technique ................. Wet continuous, fluorescent
Current ................... 1200 A head shot, 2400 A-T coil
Results ................... No relevant indications on accepted parts
Inspector / Level ......... M. Voss / Level II

I certify that the above parts were inspected in accordance with the listed specification.

/s/ Maren Voss
`,
    told: `
processor: Belmore Inspection Labs LLC
certificate_number: MT-5519
certificate_date: 2026-03-12
purchase_order: P77120
batch: B-0501
process: magnetic_particle
specification: ASTM E1444
specification_revision: 22a
class_type: Wet continuous, fluorescent
quench_delay_s: null
plating_end: null
bake_start: null
bake_end: null
signature_present: true
conformance_statement: true
part | 20-118 | B | 29 | 1 | 4340 STEEL | L77
`,
  },
  {
    name: 'condition words',
    page: `
HALVARD METALLURGICAL CORP.
Certificate of Heat Treatment

   Cert No: 55-1200            Ord No: PO-4471         Cert Dt: 2026-03-12
   Your Ref: B-0710

   Item No.      Rev Level    Qty Good    Qty Scrapped   Alloy & Temper        Lot/Serial
   10-777        D            44          2              2024-O SHEET 0.032    L12

   Soln HT to AMS 2770 Rev R, 2024-O to 2024-T42:
      Furnace 5, set 920°F, in at 08:30 on 03/09/2026, out at 09:10 on 03/09/2026 (40 min at heat)
      Water quench, 7 sec transfer
   Nat Age: RT 96 hr, 03/09/2026 09:10 thru 03/13/2026 09:10
   Rockwell B: 70.5 71.0 70.0
   Cond (%IACS): 30.0 30.2

   Above parts certified to conform to spec and purchase order requirements.
   Approved: (signature on file)
`,
    told: `
processor: HALVARD METALLURGICAL CORP.
certificate_number: 55-1200
certificate_date: 2026-03-12
purchase_order: PO-4471
batch: B-0710
process: solution_heat_treat_and_age
specification: AMS 2770
specification_revision: R
class_type: 2024-O to 2024-T42
quench_delay_s: 7
plating_end: null
bake_start: null
bake_end: null
signature_present: true
conformance_statement: true
part | 10-777 | D | 44 | 2 | 2024-O SHEET 0.032 | L12
cycle | solution | 920 | F | 2026-03-09T08:30 | 2026-03-09T09:10 | 40
cycle | natural_age | - | - | 2026-03-09T09:10 | 2026-03-13T09:10 | 5760
readings | hardness | HRB | 70.5, 71, 70
readings | conductivity | %IACS | 30, 30.2
`,
  },
  {
    name: 'qty of',
    page: `
Pinecrest Anodizing Co.
Packing List / Certification 889120                 Date 3/10/26
P.O. 4590112   Batch B-0222

Part No. 10-340 Rev. B        Ordered 50    Received 50    Shipped 50    Rejected -0-
Part No. 10-341 Rev. A        Ordered 20    Received 20    Shipped 19    Rejected 1
Mat'l: 6061-T6 PLATE     Lot: 90881

Chem film per MIL-DTL-5541 Rev F Type II Class 3

Certified to meet the requirements of the above specification and purchase order.
By: /s/ L. Brandt, Quality Engineer
`,
    told: `
processor: Pinecrest Anodizing Co.
certificate_number: 889120
certificate_date: 2026-03-10
purchase_order: 4590112
batch: B-0222
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
part | 10-340 | B | 50 | 0 | 6061-T6 PLATE | 90881
part | 10-341 | A | 19 | 1 | 6061-T6 PLATE | 90881
`,
  },
  {
    name: 'passivation',
    page: `
NORTHGATE METAL FINISHING, INC.
CERT # NMF-20117
TO: FIELDSTONE AIR INC.        DATE: 04-MAR-26
PO#: PO-26-118   LOT/BATCH: B-0301

WE HEREBY CERTIFY THAT THE FOLLOWING PARTS WERE PASSIVATED IAW AMS 2700 REV F, METHOD 1, TYPE 2:

     QTY     PART NO.       REV    LOT      MATERIAL
     34      118201-20      B      H110-2   304 STAINLESS
     12      118202-20      B      H110-2   304 STAINLESS

NO PARTS WERE REJECTED.   TEST: WATER IMMERSION - PASSED
SIGNED: _______________________
NAME: P. OKAFOR
`,
    told: `
processor: NORTHGATE METAL FINISHING, INC.
certificate_number: NMF-20117
certificate_date: 2026-03-04
purchase_order: PO-26-118
batch: B-0301
process: passivation
specification: AMS 2700
specification_revision: F
class_type: Method 1 Type 2
quench_delay_s: null
plating_end: null
bake_start: null
bake_end: null
signature_present: false
conformance_statement: true
part | 118201-20 | B | 34 | 0 | 304 STAINLESS | H110-2
part | 118202-20 | B | 12 | 0 | 304 STAINLESS | H110-2
`,
  },
  {
    name: 'duration hms',
    page: `
BELMORE THERMAL PROCESSING LLC - QUALITY RECORD
Doc #: QR-7712     Doc Date: 2026-03-12
PO / Line: PO-7001 / 10      Batch ID: B-0801
Part ID: 10-902   Rev: A   Lot ID: L31   Mat: 7075-O SHEET 0.050
Accepted Quantity: 1,200    Rejected Quantity: 0
Spec: AMS 2770R   Heat Treat To: 7075-O to 7075-T62

Stage        Setpoint    Soak Begin            Soak Finish           Elapsed (h:mm)
SHT          900 °F      2026-03-09 07:12      2026-03-09 07:57      0:45
PHT (age)    250 °F      2026-03-09 09:00      2026-03-10 09:00      24:00

Quench: agitated water 78 °F; furnace-to-quench 5.5 s
Hardness (HRB): 87.5 | 88.0 | 87.0        Conductivity (%IACS): 32.8 | 33.0
Certification: All requirements of the PO and specification have been met.
E-signed: Ines Calder 2026-03-12 14:02
`,
    told: `
processor: BELMORE THERMAL PROCESSING LLC
certificate_number: QR-7712
certificate_date: 2026-03-12
purchase_order: PO-7001
batch: B-0801
process: solution_heat_treat_and_age
specification: AMS 2770
specification_revision: R
class_type: 7075-O to 7075-T62
quench_delay_s: 5.5
plating_end: null
bake_start: null
bake_end: null
signature_present: true
conformance_statement: true
part | 10-902 | A | 1200 | 0 | 7075-O SHEET 0.050 | L31
cycle | solution | 900 | F | 2026-03-09T07:12 | 2026-03-09T07:57 | 45
cycle | artificial_age | 250 | F | 2026-03-09T09:00 | 2026-03-10T09:00 | 1440
readings | hardness | HRB | 87.5, 88, 87
readings | conductivity | %IACS | 32.8, 33
`,
  },
];

import type { House } from './told';

/** Certificates as houses of all kinds might write them, and what they say. */
export const STILL_MORE_ODD_HOUSES: readonly House[] = [
  {
    name: 'values above their labels',
    page: `
                     CORRAN METAL FINISHING, INC.
             CERTIFICATION OF SPECIAL PROCESSING

WREN AIRCRAFT PARTS            PO-5518            B-0077
Customer                       P.O. Number        Batch

26-9910                        12MAR26            AMS-QQ-P-416 REV F
Cert Number                    Date Certified     Specification

LR5518-2        C        44             0             4340 STEEL        90771
Part Number     Rev      Accepted       Rejected      Material          Lot

Type II Class 2          09MAR26 10:40             09MAR26 12:30         10MAR26 12:00
Class                    Plating complete          Bake in               Bake out

375 F            23.5 hr        .00041 .00044 .00040 in
Bake Temp        Bake Time      Thickness

We certify that the parts conform to the specification and order.

/s/ D. Quinlan                 Chief Inspector
Authorized Signature           Title
`,
    told: `
processor: CORRAN METAL FINISHING, INC.
certificate_number: 26-9910
certificate_date: 2026-03-12
purchase_order: PO-5518
batch: B-0077
process: cadmium_plate
specification: AMS-QQ-P-416
specification_revision: F
class_type: Type II Class 2
quench_delay_s: null
plating_end: 2026-03-09T10:40
bake_start: 2026-03-09T12:30
bake_end: 2026-03-10T12:00
signature_present: true
conformance_statement: true
part | LR5518-2 | C | 44 | 0 | 4340 STEEL | 90771
cycle | embrittlement_relief | 375 | F | 2026-03-09T12:30 | 2026-03-10T12:00 | 1410
readings | thickness | in | 0.00041, 0.00044, 0.0004
`,
  },
  {
    name: 'times on the day of work',
    page: `
BELMORE HEAT TREATING, INC.
Certificate of Conformance                               No. 7719-26
                                                         03/13/2026
Customer P.O. No.   P30118                Part No.   KF4410-9 Rev. B
Customer Batch No.  B-0619                Lot No.    L610
Material            2024-O SHEET 0.063    Quantity   75 pcs. (75 acc. / 0 rej.)

Date of heat treatment: 03/06/2026        Spec.: AMS 2770 Rev. R, 2024-O to 2024-T42

   Step                Temp.     Soak                    Time
   Solution HT         920 °F    08:12 - 08:54           42 min
   Quench              Water, 75 °F, delay 6 s
   Natural aging       R.T.      03/06/2026 08:54 - 03/10/2026 08:54     96 h

Mechanical tests:   HRB 70.5 / 71.0 / 71.5     30.4 / 30.6 %IACS

We hereby certify that the material was treated as shown and meets the specification.
Q.A.: /s/ R. Marlow
`,
    told: `
processor: BELMORE HEAT TREATING, INC.
certificate_number: 7719-26
certificate_date: 2026-03-13
purchase_order: P30118
batch: B-0619
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
part | KF4410-9 | B | 75 | 0 | 2024-O SHEET 0.063 | L610
cycle | solution | 920 | F | 2026-03-06T08:12 | 2026-03-06T08:54 | 42
cycle | natural_age | - | - | 2026-03-06T08:54 | 2026-03-10T08:54 | 5760
readings | hardness | HRB | 70.5, 71, 71.5
readings | conductivity | %IACS | 30.4, 30.6
`,
  },
  {
    name: 'label and value glued',
    page: `
OXBOW PLATING WORKS, 77 Industrial Park Dr, Tulsa, OK 74103
CERT#:OP-5519 DATE:03/12/26 PO#:PO-6612 BATCH#:B-0405
PN:20-881 REV:D QTY:64 ACC:64 REJ:0 LOT:H88-2 MATL:4340 STEEL
PROC:CAD PLATE SPEC:AMS-QQ-P-416F TY:II CL:2
PLATE END:03/09/26 13:20 BAKE ON:03/09/26 15:05 BAKE OFF:03/10/26 14:35 TEMP:375F TIME:23.5HRS
THK:430/445/451 UIN
PARTS CONFORM TO THE REQUIREMENTS OF THE SPEC. CERTIFIED BY: /S/ I CALDER
`,
    told: `
processor: OXBOW PLATING WORKS
certificate_number: OP-5519
certificate_date: 2026-03-12
purchase_order: PO-6612
batch: B-0405
process: cadmium_plate
specification: AMS-QQ-P-416
specification_revision: F
class_type: Type II Class 2
quench_delay_s: null
plating_end: 2026-03-09T13:20
bake_start: 2026-03-09T15:05
bake_end: 2026-03-10T14:35
signature_present: true
conformance_statement: true
part | 20-881 | D | 64 | 0 | 4340 STEEL | H88-2
cycle | embrittlement_relief | 375 | F | 2026-03-09T15:05 | 2026-03-10T14:35 | 1410
readings | thickness | microinch | 430, 445, 451
`,
  },
  {
    name: 'requirement and result below one another',
    page: `
Pinecrest Testing Laboratory
Certificate of Test & Heat Treatment
Certificate .......... PT-2210
Dated ................ 12 March 2026
Order ................ PO-4419
Consignment batch .... B-0244
Component ............ 118820-33, issue C
Cast ................. 88210
Stock ................ 7075-O SHEET 0.050
Number off ........... 22 (all accepted)
Specification ........ AMS 2770 revision R
Treatment ............ 7075-O to 7075-T62

Solution treatment
  required 890 - 910 °F for 30 - 60 min
  achieved 900 °F for 44 min
  charged 9 March 2026 08:20, quenched 9 March 2026 09:04
  transfer to water 5 s (limit 10 s)
Precipitation treatment
  required 240 - 260 °F for 23 h minimum
  achieved 250 °F for 24 h
  from 9 March 2026 11:00 to 10 March 2026 11:00

Hardness required 84 HRB min.; found 87, 88, 87.5 HRB
Conductivity required 30.0 - 35.0; found 32.2, 32.5 %IACS

Certified that the parts conform to the order.
Signed /s/ Maren Voss
`,
    told: `
processor: Pinecrest Testing Laboratory
certificate_number: PT-2210
certificate_date: 2026-03-12
purchase_order: PO-4419
batch: B-0244
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
part | 118820-33 | C | 22 | - | 7075-O SHEET 0.050 | 88210
cycle | solution | 900 | F | 2026-03-09T08:20 | 2026-03-09T09:04 | 44
cycle | artificial_age | 250 | F | 2026-03-09T11:00 | 2026-03-10T11:00 | 1440
readings | hardness | HRB | 87, 88, 87.5
readings | conductivity | %IACS | 32.2, 32.5
`,
  },
  {
    name: 'serial numbered parts',
    page: `
KESTREL HILL NDT LTD                                  Inspection Certificate: KH/MT/0212
                                                      Date: 11 Mar 2026
Customer order: PO-26-512                             Batch: B-0505
Technique: MPI, wet continuous fluorescent            Standard: ASTM E1444-22

Item   Part number   Issue   Lot      Material      Insp   Acc   Rej   Remarks
1      20-118-1      B       L12      4130 STEEL    20     19    1     S/N 0014 cracked
2      20-118-2      B       L12      4130 STEEL    20     20    0

The above items have been inspected in accordance with the above standard. Inspector approval: NAS 410 Level II
Signed: /s/ T. J. Whitfield
`,
    told: `
processor: KESTREL HILL NDT LTD
certificate_number: KH/MT/0212
certificate_date: 2026-03-11
purchase_order: PO-26-512
batch: B-0505
process: magnetic_particle
specification: ASTM E1444
specification_revision: 22
class_type: wet continuous fluorescent
quench_delay_s: null
plating_end: null
bake_start: null
bake_end: null
signature_present: true
conformance_statement: true
part | 20-118-1 | B | 19 | 1 | 4130 STEEL | L12
part | 20-118-2 | B | 20 | 0 | 4130 STEEL | L12
`,
  },
  {
    name: 'mail in prose',
    page: `
Hello,

Please take this as our certificate of conformity no. HT86383, dated 7 March
2026, for your order PO-26-393 (your batch B-0598, our job 3473). In the box
are:

* 53 off DX1377-2 issue E, lot L42
* 110 off WA5582-4 issue A, lot L407

Process was stress relieving to AMS 2759/11 Rev A. Stress relieving was 1 h
15 min at 621 °C, from 28 Feb 2026 06:35 until 28 Feb 2026 07:50.

Shout if anything is missing from the box.

/s/ Ines Calder

Ines Calder, Quality Engineer
Wintergreen Thermal
77 Industrial Park Dr
Tel. 01632 960550 (ext. 31)
`,
    told: `
processor: Wintergreen Thermal
certificate_number: HT86383
certificate_date: 2026-03-07
purchase_order: PO-26-393
batch: B-0598
process: stress_relief
specification: AMS 2759/11
specification_revision: A
class_type: null
quench_delay_s: null
plating_end: null
bake_start: null
bake_end: null
signature_present: true
conformance_statement: false
part | DX1377-2 | E | 53 | - | - | L42
part | WA5582-4 | A | 110 | - | - | L407
cycle | stress_relief | 621 | C | 2026-02-28T06:35 | 2026-02-28T07:50 | 75
`,
  },
  {
    name: 'headings of two storeys',
    page: `
FAIRWATER PLATING GMBH                                              PROCESS CERTIFICATION REPORT

Certificate: C-4428      Certificate date: 04/16/2026     Order: PO-7054       Shop order: 283975
Process: CAD PLATE       Specification: AMS-QQ-P-416 Rev F      Class/Cond: Type II Class 2

       PART                                MATERIAL                         QUANTITY
Ln   Number        Rev   Name       Description      Lot       Received   Accepted   Rejected
1    335288-91     D     BRACKET    4340 STEEL       20293     119        118        1

           CYCLE                        SOAK START              SOAK END             TOTAL
Operation     Equip.    Set °F      Date          Time      Date          Time       Time
BAKE          F8        375         04/07/2026    10:17     04/08/2026    09:17      23.0 HRS

Plating completed: 04/07/2026 07:05
Deposit thickness: 0.43, 0.33 mil

The articles of this report are certified to have been processed in accordance with the specification.

Approved by
     R. Marlow, Quality Engineer
`,
    told: `
processor: FAIRWATER PLATING GMBH
certificate_number: C-4428
certificate_date: 2026-04-16
purchase_order: PO-7054
batch: null
process: cadmium_plate
specification: AMS-QQ-P-416
specification_revision: F
class_type: Type II Class 2
quench_delay_s: null
plating_end: 2026-04-07T07:05
bake_start: 2026-04-07T10:17
bake_end: 2026-04-08T09:17
signature_present: false
conformance_statement: true
part | 335288-91 | D | 118 | 1 | 4340 STEEL | 20293
cycle | embrittlement_relief | 375 | F | 2026-04-07T10:17 | 2026-04-08T09:17 | 1380
readings | thickness | mil | 0.43, 0.33
`,
  },
];

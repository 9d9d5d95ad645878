/** One line a list should give: designators, quantity, value in SI units or null, and "x" where not fitted. */
export type Fact = [designators: string, quantity: number | null, si: string | null, mark?: "x"];

export interface MessyList {
  name: string;
  text: string;
  heading: number | null;
  lines: Fact[];
  /** Codes of the questions, in row order. */
  asks?: string[];
  /** Reasons of the skipped rows that are not blank, in row order. */
  skips?: string[];
}

/** Lists made up for these tests: layouts, languages and slips as people produce them. */
export const MESSY_LISTS: MessyList[] = [
  {
    name: "German, semicolons, decimal commas, title above, total below",
    text: "Stückliste Lötübung;;;;\n;;;;\nBauteil;Menge;Wert;Bauform;Einzelpreis\nR1, R2;2;4,7k;0207;0,02 €\nR3;1;470R;0207;0,02 €\nC1;1;100nF;RM 5;0,05 €\nIC1;1;NE555;DIP-8;0,25 €\nSumme;;;;0,36 €\n",
    heading: 2,
    lines: [
      ["R1 R2", 2, "4700"],
      ["R3", 1, "470"],
      ["C1", 1, "0.0000001"],
      ["IC1", 1, null],
    ],
    asks: ["looks-like-total"],
    skips: ["above-the-heading", "heading"],
  },
  {
    name: "French, quoted cells with line breaks, one part not fitted",
    text: '"Repère","Qté","Désignation","Valeur"\n"R1\nR2\nR3",3,"Résistance couche carbone\n1/4 W","2k2"\n"C1",1,"Condensateur céramique","22 nF"\n"C2",1,"Condensateur (non monté)","10 µF"\n',
    heading: 0,
    lines: [
      ["R1 R2 R3", 3, "2200"],
      ["C1", 1, "0.000000022"],
      ["C2", 1, "0.00001", "x"],
    ],
  },
  {
    name: "Spanish, tabs, a range, a mismatch",
    text: "Referencia\tCantidad\tValor\tDescripción\nR1-R4\t4\t10k\tResistencia 5%\nLED1-LED3\t2\trojo\tLED 5 mm\nSW1\t1\t\tPulsador 6x6\n",
    heading: 0,
    lines: [
      ["R1 R2 R3 R4", 4, "10000"],
      ["LED1 LED2 LED3", 3, null],
      ["SW1", 1, null],
    ],
    asks: ["quantity-mismatch"],
  },
  {
    name: "no heading at all, designators second",
    text: '2,"R1,R2",1k,0207\n1,R3,220,0207\n3,"C1,C2,C3",100nF,disc\n1,D1,1N4148,DO-35\n',
    heading: null,
    lines: [
      ["R1 R2", 2, "1000"],
      ["R3", 1, "220"],
      ["C1 C2 C3", 3, "0.0000001"],
      ["D1", 1, null],
    ],
  },
  {
    name: "drawn table with repeated rules",
    text: "+------+-----+--------+\n| Ref  | Qty | Value  |\n+------+-----+--------+\n| R1   | 1   | 4R7    |\n+------+-----+--------+\n| C1,  | 2   | 47µ    |\n| C2   |     | 16V    |\n+------+-----+--------+\n",
    heading: 1,
    lines: [
      ["R1", 1, "4.7"],
      ["C1 C2", 2, "0.000047"],
    ],
    asks: ["value-without-unit"],
    skips: ["separator", "heading", "separator", "separator", "separator"],
  },
  {
    name: "list in Markdown",
    text: "| Part | Count | What |\n|---|---|---|\n| U1 | 1 | Timer |\n| R1–R3 | 3 | 1 kΩ |\n",
    heading: 0,
    lines: [
      ["U1", 1, null],
      ["R1 R2 R3", 3, "1000"],
    ],
    skips: ["heading", "separator"],
  },
  {
    name: "designators with commas that nobody quoted",
    text: "Reference,Qty,Value,Footprint\nR1,R2,R3,3,10k,0207\nR4,1,22k,0207\nC1,C2,2,100nF,RM5\nD1,1,1N4148,DO-35\nQ1,1,BC547,TO-92\nU1,1,LM358,DIP-8\n",
    heading: 0,
    lines: [
      ["R1 R2 R3", 3, "10000"],
      ["R4", 1, "22000"],
      ["C1 C2", 2, "0.0000001"],
      ["D1", 1, null],
      ["Q1", 1, null],
      ["U1", 1, null],
    ],
  },
  {
    name: "written by hand, one part to a line",
    text: "R1, R2: 10k\nR3: 470 ohm\nC1: 100nF ceramic\nD1: 1N4148\nU1: LM358\n",
    heading: null,
    lines: [
      ["R1 R2", 2, "10000"],
      ["R3", 1, "470"],
      ["C1", 1, "0.0000001"],
      ["D1", 1, null],
      ["U1", 1, null],
    ],
  },
  {
    name: "shopping list by quantity",
    text: "4 x resistor 10k\n2 x capacitor 100nF\n1 x push button\n10 x M3 screw\n",
    heading: null,
    lines: [
      ["", 4, "10000"],
      ["", 2, "0.0000001"],
      ["", 1, null],
      ["", 10, null],
    ],
  },
  {
    name: "sections, repeated heading, remarks and a board without designator",
    text: "Ref,Qty,Value,Notes\nResistors,,,\nR1,1,1M,\nR2,1,2R2,\nCapacitors,,,\nRef,Qty,Value,Notes\nC1,1,470n,\nC2,1,4n7,film\n,1,Main board,58 x 42 mm\nNote: solder the low parts first,,,\n",
    heading: 0,
    lines: [
      ["R1", 1, "1000000"],
      ["R2", 1, "2.2"],
      ["C1", 1, "0.00000047"],
      ["C2", 1, "0.0000000047"],
      ["", 1, null],
    ],
    asks: ["value-without-unit"],
    skips: ["heading", "section-title", "section-title", "repeated-heading", "remark"],
  },
  {
    name: "columns set out with blanks, empty cells between",
    text: "Ref     Qty  Value    Body\nR1,R2   2    33k      0207\nC1      1    220u\nJ1      1             2 pin\nU1      1    4093     DIP-14\n",
    heading: 0,
    lines: [
      ["R1 R2", 2, "33000"],
      ["C1", 1, "0.00022"],
      ["J1", 1, null],
      ["U1", 1, null],
    ],
    asks: ["value-without-unit"],
  },
  {
    name: "Polish, prices with currency behind, a cross in the column for not fitted",
    text: "Oznaczenie;Ilość;Wartość;Obudowa;Nie montować;Cena\nR1;1;1k5;0207;;0,05 zł\nR2;1;0R;0207;x;0,05 zł\nC1,C2;2;1µF/50V;;;0,20 zł\n",
    heading: 0,
    lines: [
      ["R1", 1, "1500"],
      ["R2", 1, "0", "x"],
      ["C1 C2", 2, "0.000001"],
    ],
  },
  {
    name: "Czech, Italian-like order of columns, quantity last",
    text: 'Pouzdro,Hodnota,Označení,Počet ks\n0207,"4,7k","R1, R2",2\nTO-92,BC547,T1,1\nRM 5,10n,C1,1\n',
    heading: 0,
    lines: [
      ["R1 R2", 2, "4700"],
      ["T1", 1, null],
      ["C1", 1, "0.00000001"],
    ],
    asks: ["value-without-unit"],
  },
  {
    name: "Japanese headings",
    text: '位号,数量,値,備考\nR1,1,10kΩ,1/4W\n"C1,C2",2,0.1μF,\nD1,1,1N4148,\n',
    heading: 0,
    lines: [
      ["R1", 1, "10000"],
      ["C1 C2", 2, "0.0000001"],
      ["D1", 1, null],
    ],
  },
  {
    name: "value only in the description, capitals",
    text: "Item,Ref Des,Qty,Description,Mfr,Mfr P/N\n1,R1,1,RES 4.7K OHM 1/4W 5% AXIAL,Ohmwerk,OW-472\n2,C5,1,CAP CER 0.01UF 50V X7R RADIAL,Kappa,KP-103\n3,L1,1,INDUCTOR 100UH 10% AXIAL,Spulka,SP-101\n4,X1,1,CRYSTAL 16.000MHZ HC49,Quarta,QA-16\n",
    heading: 0,
    lines: [
      ["R1", 1, "4700"],
      ["C5", 1, "0.00000001"],
      ["L1", 1, "0.0001"],
      ["X1", 1, "16000000"],
    ],
  },
  {
    name: "three-figure marking, microfarads without unit, a slip of the keyboard",
    text: "Ref,Value\nC1,104\nC2,.047\nC3,0.1uk\nR1,22\n",
    heading: 0,
    lines: [
      ["C1", 1, "0.0000001"],
      ["C2", 1, "0.000000047"],
      ["C3", 1, "0.0000001"],
      ["R1", 1, "22"],
    ],
    asks: ["value-without-unit", "value-without-unit", "value-without-unit"],
  },
  {
    name: "quantities that are no numbers",
    text: "Part,Qty,Description\nCable,0.5 m,two cores\nPins,a few,header pins\nSpacers,4 pcs,M3 x 10\nTape,2 of 100,bandolier\n",
    heading: 0,
    lines: [
      ["", 1, null],
      ["", null, null],
      ["", 4, null],
      ["", 2, null],
    ],
    asks: ["quantity-not-a-number", "quantity-not-a-number", "quantity-of-pack"],
  },
  {
    name: "the same designator in two rows and twice in one",
    text: 'Designator,Quantity,Value\n"C1,C2",2,100nF\n"C2,C3",2,10uF\n"R1,R1",2,1k\n',
    heading: 0,
    lines: [
      ["C1 C2", 2, "0.0000001"],
      ["C3", 1, "0.00001"],
      ["R1 R1", 2, "1000"],
    ],
    asks: ["designator-in-two-rows", "designator-twice-in-row"],
  },
  {
    name: "a price for a hundred",
    text: "Pos;Menge;Wert;EUR\nBT1;1;Halter 2xAA;0,66/100\nR1;1;10k;0,008\n",
    heading: 0,
    lines: [
      ["BT1", 1, null],
      ["R1", 1, "10000"],
    ],
    asks: ["price-unclear"],
  },
  {
    name: "declared separator, names that look like ranges",
    text: "sep=|\r\nName|Qty|Value\r\nIC1_PINS_1_14|1|socket strip\r\nU2-1|1|gate\r\nR10-12|3|1k\r\n",
    heading: 1,
    lines: [
      ["IC1_PINS_1_14", 1, null],
      ["U2-1", 1, null],
      ["R10 R11 R12", 3, "1000"],
    ],
    skips: ["above-the-heading", "heading"],
  },
  {
    name: "every line in quotes of its own",
    text: '"Ref,Qty,Value"\n"R1,1,10k"\n"C1,1,""100 nF"""\n"D1,1,1N4148"\n',
    heading: 0,
    lines: [
      ["R1", 1, "10000"],
      ["C1", 1, "0.0000001"],
      ["D1", 1, null],
    ],
  },
  {
    name: "fiducials, holes and test points beside parts",
    text: 'Ref,Qty,Value,Footprint\nFID1,1,Fiducial,Fiducial_1mm\n"H1,H2",2,MountingHole,Hole_3.2mm\nTP1,1,TestPoint,Pad_1.5mm\nR1,1,10k,0207\n',
    heading: 0,
    lines: [["R1", 1, "10000"]],
    asks: ["hardly-a-part", "hardly-a-part", "hardly-a-part"],
  },
  {
    name: "the same parts ungrouped and grouped",
    text: 'Item,Qty,Ref,Value\n,,R1,10k\n,,R2,10k\n,,C1,100nF\n,,C2,100nF\n\nItem,Qty,Ref,Value\n1,2,"R1, R2",10k\n2,2,"C1, C2",100nF\n',
    heading: 0,
    lines: [
      ["R1 R2", 2, "10000"],
      ["C1 C2", 2, "0.0000001"],
    ],
    asks: ["same-parts-twice"],
    skips: ["heading", "other-table", "other-table", "other-table", "other-table"],
  },
  {
    name: "sections that name the class, no designators",
    text: "Component\tPcs\nResistors\t\n10k\t4\n1k\t2\nCapacitors\t\n100nF\t3\nMisc\t\nPCB\t1\n",
    heading: 0,
    lines: [
      ["", 4, "10000"],
      ["", 2, "1000"],
      ["", 3, "0.0000001"],
      ["", 1, null],
    ],
    skips: ["heading", "section-title", "section-title", "section-title"],
  },
  {
    name: "Dutch, a potentiometer under P, designators joined by a plus",
    text: "Aantal;Onderdeel;Waarde\n3x;R1/R2/R3;10K 1%\n1x;P1;50k lin\n2x;C1+C2;2u2/63V\n",
    heading: 0,
    lines: [
      ["R1 R2 R3", 3, "10000"],
      ["P1", 1, "50000"],
      ["C1 C2", 2, "0.0000022"],
    ],
  },
  {
    name: "designators parted by the delimiter in the last column",
    text: "No;Qty.;Description;Location\n1;10;Resistor 330R 0.25W;R1...R10\n2;2;Elco 100 µF/25V RM2.5;C1;C2\n3;1;Platine;\n",
    heading: 0,
    lines: [
      ["R1 R2 R3 R4 R5 R6 R7 R8 R9 R10", 10, "330"],
      ["C1 C2", 2, "0.0001"],
      ["", 1, null],
    ],
  },
  {
    name: "descriptions with commas and no blanks, a consumable as required",
    text: "Part Number\tDescription\tRef Designator\tQty Per\tUM\n100-0001\tRES,CF,10K,1/4W,5%\tR1,R3\t2\tEA\n100-0002\tCAP,ELEC,47UF,25V\tC1\t1\tEA\n300-0005\tSOLDER\t\tAR\tGM\n",
    heading: 0,
    lines: [
      ["R1 R3", 2, "10000"],
      ["C1", 1, "0.000047"],
      ["", null, null],
    ],
    asks: ["quantity-not-a-number"],
  },
];

/**
 * Ions that chemists write, in canonical spelling, group by group. They decide between the readings of a charge without
 * a caret (see `read-ranking.ts`) and lend themselves as did-you-mean. Sources: names and formulas of IUPAC Red Book
 * 2005, table IX; the ions of published tables of standard electrode potentials and Gibbs energies (Bard, Parsons and
 * Jordan 1985; CRC Handbook; NBS tables 1982); complexes and baths of plating and analysis: common practice, no source.
 * All typed from memory. A correction is made here, in its group.
 */
export const ION_GROUPS: Readonly<Record<string, string>> = {
  'monatomic cations, groups 1 to 3':
    'H^+ Li^+ Na^+ K^+ Rb^+ Cs^+ Fr^+ Be^2+ Mg^2+ Ca^2+ Sr^2+ Ba^2+ Ra^2+ Sc^3+ Y^3+ La^3+ Ac^3+ He^+ He^2+ {2H}^+ {3H}^+',
  'monatomic cations, transition metals':
    'Ti^2+ Ti^3+ Ti^4+ Zr^4+ Hf^4+ V^2+ V^3+ V^4+ V^5+ Nb^3+ Nb^5+ Ta^5+ Cr^2+ Cr^3+ Cr^6+ Mo^3+ Mo^4+ Mo^6+ W^4+ W^6+ ' +
    'Mn^+ Mn^2+ Mn^3+ Mn^4+ Mn^7+ Tc^4+ Re^3+ Fe^+ Fe^2+ Fe^3+ Fe^4+ Ru^2+ Ru^3+ Ru^4+ Os^2+ Os^3+ Os^4+ Co^+ Co^2+ Co^3+ Co^4+ ' +
    'Rh^+ Rh^3+ Ir^+ Ir^3+ Ir^4+ Ni^+ Ni^2+ Ni^3+ Ni^4+ Pd^2+ Pd^4+ Pt^2+ Pt^4+ Cu^+ Cu^2+ Cu^3+ Ag^+ Ag^2+ Ag^3+ Au^+ Au^3+ ' +
    'Zn^2+ Cd^2+ Hg^2+ Hg2^2+ Cd2^2+ Zn2^2+',
  'monatomic cations, groups 13 to 16':
    'B^3+ Al^3+ Ga^+ Ga^3+ In^+ In^2+ In^3+ Tl^+ Tl^3+ C^4+ Si^4+ Ge^2+ Ge^4+ Sn^2+ Sn^4+ Pb^2+ Pb^4+ N^5+ N^3+ P^5+ P^3+ As^3+ ' +
    'As^5+ Sb^3+ Sb^5+ Bi^+ Bi^3+ Bi^5+ S^4+ S^6+ Se^4+ Te^4+ Po^2+ Po^4+ I^+ Cl^+ Br^+',
  'monatomic cations, lanthanoids and actinoids':
    'Ce^3+ Ce^4+ Pr^3+ Pr^4+ Nd^2+ Nd^3+ Pm^3+ Sm^2+ Sm^3+ Eu^2+ Eu^3+ Gd^3+ Tb^3+ Tb^4+ Dy^2+ Dy^3+ Ho^3+ Er^3+ Tm^2+ Tm^3+ ' +
    'Yb^2+ Yb^3+ Lu^3+ Th^4+ Pa^4+ Pa^5+ U^3+ U^4+ U^5+ U^6+ Np^3+ Np^4+ Np^5+ Pu^3+ Pu^4+ Am^2+ Am^3+ Am^4+ Cm^3+ Bk^3+ Bk^4+ ' +
    'Cf^2+ Cf^3+ Es^2+ Es^3+ Fm^2+ Fm^3+ Md^2+ Md^3+ No^2+ No^3+ Lr^3+',
  'monatomic anions':
    'H^- {2H}^- F^- Cl^- Br^- I^- At^- O^- O^2- S^2- Se^2- Te^2- N^3- P^3- As^3- Sb^3- Bi^3- C^4- Si^4- Ge^4- Na^- K^- Cs^- Au^-',
  'homopolyatomic ions':
    'O2^- O2^2- O3^- O2^+ S2^2- S3^- S3^2- S4^2- S5^2- S6^2- S7^2- S8^2- S4^2+ S8^2+ Se2^2- Se3^2- Se4^2- Se4^2+ Se8^2+ ' +
    'Te2^2- Te3^2- Te4^2+ I3^- I5^- I7^- I2^+ Br3^- Br2^+ Cl3^- Cl2^- Br2^- I2^- N3^- N5^+ C2^2- C60^- C60^2- P4^2- ' +
    'Pb9^4- Sn9^4- Ge9^4- Sn5^2- Pb5^2- Bi5^3+ Bi9^5+ Bi4^2- As4^2- Sb7^3- As7^3- P7^3- Sn4^4- Si4^4- Ge4^4- H2^+ H3^+',
  'hydrogen and oxygen': 'OH^- {2H}O^- O{2H}^- OD^- H3O^+ D3O^+ H5O2^+ H9O4^+ HO2^- OH^+ HF2^- H2F^+ H2F3^-',
  'halogens with oxygen and with one another':
    'ClO^- ClO2^- ClO3^- ClO4^- BrO^- BrO2^- BrO3^- BrO4^- IO^- IO2^- IO3^- IO4^- IO6^5- H4IO6^- H3IO6^2- H2IO6^3- HIO5^2- ' +
    'H2I2O10^4- I2O9^4- ICl2^- ICl4^- IBr2^- I2Cl^- I2Br^- BrCl2^- Br2Cl^- ClF2^- BrF4^- ClF2^+ ICl2^+ IF6^- IO2^+ HClO^+ ClO2^+',
  'sulfur, selenium, tellurium':
    'SO4^2- SO3^2- SO2^2- SO2^- SO3^- SO4^- SO5^2- S2O3^2- S2O4^2- S2O5^2- S2O6^2- S2O7^2- S2O8^2- S3O6^2- S4O6^2- S5O6^2- ' +
    'S6O6^2- S3O10^2- HSO4^- HSO3^- HSO5^- HS2O3^- HS2O4^- HS2O7^- HS^- HS2^- HS3^- HS4^- HS5^- SH^- SCN^- NCS^- SO3F^- SO3Cl^- ' +
    'NH2SO3^- N(SO3)2^3- SeO4^2- SeO3^2- HSeO4^- HSeO3^- HSe^- SeCN^- SeS^2- SeSO3^2- TeO4^2- TeO3^2- HTeO3^- HTeO2^+ TeO2^2- HTe^- ' +
    'Te(OH)3^+ H5TeO6^- H4TeO6^2- TeO6^6- TeCl6^2- SeCl6^2- SF5^- SOF^+',
  nitrogen:
    'NO3^- NO2^- NO^+ NO2^+ NO^- N2O2^2- HN2O2^- N2O3^2- NO4^3- ONOO^- NH4^+ ND4^+ NH2^- NH^2- N2H5^+ N2H6^2+ NH3OH^+ NH2O^- N2H3^- ' +
    'CN^- OCN^- CNO^- NCO^- N(CN)2^- C(CN)3^- HN2^+ N2^+ N2F^+ NF4^+ PH4^+ AsH4^+',
  'phosphorus, arsenic, antimony, bismuth':
    'PO4^3- HPO4^2- H2PO4^- PO3^- PO3^3- HPO3^2- H2PO3^- H2PO2^- HPO2^2- P2O7^4- HP2O7^3- H2P2O7^2- H3P2O7^- P3O10^5- P3O9^3- ' +
    'P4O12^4- P4O13^6- P2O6^4- HP2O6^3- H2P2O6^2- PO5^3- P2O8^4- PO4F^4- PO3F^2- PO2F2^- PF6^- PCl4^+ PCl6^- PS4^3- PH2^- ' +
    'AsO4^3- HAsO4^2- H2AsO4^- AsO3^3- HAsO3^2- H2AsO3^- AsO2^- As(OH)4^- AsS3^3- AsS4^3- AsF6^- AsO^+ SbO^+ SbO2^- SbO3^- ' +
    'Sb(OH)6^- Sb(OH)4^- SbO4^3- SbS3^3- SbS4^3- SbCl4^- SbCl6^- SbCl6^3- SbF6^- Sb2S4^2- Sb2(C4H2O6)2^2- BiO^+ BiO2^- BiO3^- BiCl4^- ' +
    'BiI4^- Bi(OH)2^+ BiOH^2+ Bi6O4(OH)4^6+ BiCl6^3- BiBr4^-',
  'carbon and silicon, organic ions':
    'CO3^2- HCO3^- CO3^- CO2^- CO2^2- HCO4^- C2O6^2- HCOO^- HCO2^- CHO2^- C2O4^2- HC2O4^- CH3COO^- CH3CO2^- C2H3O2^- CH3CH2COO^- ' +
    'C2H5COO^- C3H5O2^- C3H5O3^- C4H4O6^2- HC4H4O6^- C4H2O4^2- C4H4O4^2- C6H5O7^3- HC6H5O7^2- H2C6H5O7^- C6H5COO^- C7H5O2^- C6H5O^- ' +
    'C7H4O3^2- C6H7O6^- C6H11O7^- C8H4O4^2- CH3O^- C2H5O^- CH3^- CH3^+ CH3S^- C6H5^- C5H5^- CH3SO3^- CF3SO3^- CF3COO^- C6H5SO3^- ' +
    'C12H25SO4^- N(SO2CF3)2^- CCl3COO^- CH2ClCOO^- NH2CH2COO^- CH3NH3^+ C5H5NH^+ N(CH3)4^+ N(C2H5)4^+ N(C4H9)4^+ P(C6H5)4^+ ' +
    'As(C6H5)4^+ C6H5NH3^+ C12H14N2^2+ C12H14N2^+ C10H12N2O8^4- C10H13N2O8^3- C10H14N2O8^2- C6H6NO6^3- C6H4O2^2- C6H4O2^- ' +
    'SiO4^4- SiO3^2- HSiO3^- H3SiO4^- H2SiO4^2- Si2O7^6- Si2O5^2- Si3O9^6- Si6O18^12- SiF6^2- GeO3^2- HGeO3^- GeF6^2- SnO3^2- SnO2^2- ' +
    'HSnO2^- Sn(OH)3^- Sn(OH)6^2- SnCl3^- SnCl4^2- SnCl6^2- SnF6^2- SnF3^- SnS3^2- Sn(C2O4)2^2- SnOH^+ PbO2^2- PbO3^2- PbO4^4- HPbO2^- ' +
    'Pb(OH)3^- Pb(OH)4^2- Pb(OH)6^2- PbCl3^- PbCl4^2- PbCl6^2- PbCl^+ PbOH^+ PbI4^2- PbI3^- Pb4(OH)4^4+ CS3^2- C3^4- HCC^- C2H^-',
  'boron, aluminium, gallium, indium, thallium':
    'B(OH)4^- BO2^- BO3^3- B4O7^2- HB4O7^- B4O5(OH)4^2- BO3^- H2BO3^- HBO3^2- BF4^- BF3OH^- BCl4^- BH4^- B2H7^- B10H10^2- B12H12^2- ' +
    'B(C6H5)4^- B(CN)4^- B(C2O4)2^- AlO2^- AlO^+ AlO3^3- Al(OH)4^- Al(OH)6^3- AlOH^2+ Al(OH)2^+ AlF6^3- AlF4^- AlF5^2- AlCl4^- Al2Cl7^- ' +
    'AlH4^- AlH6^3- Al(H2O)6^3+ AlBr4^- Al13O4(OH)24^7+ GaO2^- Ga(OH)4^- GaCl4^- GaCl2^- H2GaO3^- HGaO3^2- InCl4^- InCl6^3- In(OH)4^- InO2^- ' +
    'TlCl4^- TlCl6^3- TlCl2^- TlBr4^- TlO^+ Tl(OH)4^- AlSiO4^- AlSi3O8^-',
  'beryllium and magnesium':
    'BeO2^2- Be2O3^2- Be(OH)4^2- BeF4^2- BeF3^- BeCl4^2- MgOH^+ MgCl3^- MgCl4^2- MgCl^+ CaOH^+ Be3(OH)3^3+',
  'titanium, zirconium, hafnium':
    'TiO^2+ TiO3^2- TiF6^2- TiF6^3- TiCl6^2- TiCl6^3- TiCl4^- TiOH^3+ TiOH^2+ Ti(OH)3^+ Ti(OH)2^2+ TiO2^2+ HTiO3^- ZrO^2+ ZrO3^2- ZrF6^2- ' +
    'ZrF7^3- ZrCl6^2- HZrO3^- Zr4(OH)8^8+ HfO^2+ HfF6^2- HfCl6^2-',
  'vanadium, niobium, tantalum':
    'VO^2+ VO^+ VO2^+ VO3^- VO4^3- HVO4^2- H2VO4^- V2O7^4- V3O9^3- V4O12^4- V10O28^6- HV10O28^5- H2V10O28^4- V4O9^2- HV2O5^- VOH^2+ ' +
    'V(OH)4^+ V(CN)6^3- V(CN)6^4- VF6^- VCl6^3- VO(OH)^+ V(H2O)6^2+ V(H2O)6^3+ NbO3^- Nb6O19^8- NbF7^2- NbF6^- NbCl6^- NbOF5^2- TaO3^- ' +
    'TaF7^2- TaF6^- TaCl6^- Ta6O19^8- NbO^3+',
  'chromium, molybdenum, tungsten':
    'CrO4^2- Cr2O7^2- HCrO4^- Cr3O10^2- Cr4O13^2- HCr2O7^- CrO3Cl^- CrO2^- CrO3^3- CrO4^3- CrO8^3- Cr(OH)4^- Cr(OH)6^3- CrOH^2+ Cr(OH)2^+ ' +
    'CrO2^2+ Cr(CN)6^3- Cr(CN)6^4- Cr(H2O)6^3+ Cr(H2O)6^2+ Cr(NH3)6^3+ CrF6^3- CrCl6^3- CrCl^2+ CrCl2^+ Cr(C2O4)3^3- Cr(SCN)6^3- MoO4^2- ' +
    'HMoO4^- Mo2O7^2- Mo7O24^6- Mo8O26^4- MoO2^2+ MoO2^+ MoOCl5^2- MoCl6^3- Mo2Cl8^4- MoS4^2- Mo(CN)8^3- Mo(CN)8^4- MoOS3^2- MoO2S2^2- ' +
    'MoF6^- WO4^2- HWO4^- W2O7^2- W6O19^2- W7O24^6- W10O32^4- W12O39^6- H2W12O42^10- H2W12O40^6- W(CN)8^3- W(CN)8^4- WS4^2- WCl6^- W2Cl9^3- ' +
    'PMo12O40^3- PW12O40^3- SiW12O40^4- SiMo12O40^4- P2W18O62^6- AsMo12O40^3- PMo12O40^4- PMo12O40^5- PMo12O40^7- BW12O40^5- ' +
    'H2PMo12O40^- HPMo12O40^2- SiW12O40^5- SiW12O40^6- PW12O40^4- P2Mo18O62^6- CoW12O40^5- CoW12O40^6- PV2Mo10O40^5- PVMo11O40^4-',
  'manganese, technetium, rhenium':
    'MnO4^- MnO4^2- MnO4^3- MnO3^- MnO3^2- MnO2^- MnO^+ MnO2^+ MnOH^+ MnOH^2+ Mn(OH)3^- Mn(OH)4^2- Mn(OH)6^3- Mn(OH)6^2- HMnO2^- HMnO4^- ' +
    'Mn(CN)6^5- Mn(CN)6^4- Mn(CN)6^3- MnF6^2- MnCl4^2- MnCl6^2- Mn(H2O)6^2+ Mn(C2O4)3^3- Mn(P2O7)2^5- Mn(H2P2O7)3^3- TcO4^- TcO4^2- TcO3^- TcCl6^2- ReO4^- ReO4^2- ' +
    'ReO3^- ReCl6^2- Re2Cl8^2- Re2Cl8^4- ReF8^2- ReH9^2- TcH9^2-',
  iron:
    'FeO4^2- FeO4^3- FeO3^2- FeO2^- FeO2^2- FeO^2+ HFeO2^- HFeO4^- FeOH^2+ FeOH^+ Fe(OH)2^+ Fe(OH)3^- Fe(OH)4^- Fe(OH)4^2- Fe(OH)6^3- Fe2(OH)2^4+ ' +
    'Fe(CN)6^3- Fe(CN)6^4- HFe(CN)6^3- H2Fe(CN)6^2- Fe(CN)5NO^2- Fe(CN)5NO^3- Fe(CN)5(H2O)^3- FeFe(CN)6^- FeCl4^- FeCl4^2- FeCl6^3- FeCl2^+ ' +
    'FeCl^2+ FeCl^+ FeF6^3- FeF^2+ FeF2^+ Fe(H2O)6^2+ Fe(H2O)6^3+ Fe(SCN)^2+ FeSCN^2+ Fe(SCN)6^3- Fe(NCS)6^3- Fe(C2O4)3^3- Fe(C2O4)2^2- ' +
    'FeSO4^+ Fe(SO4)2^- FePO4^- FeHPO4^+ Fe(C10H8N2)3^2+ Fe(C10H8N2)3^3+ Fe(C12H8N2)3^2+ Fe(C12H8N2)3^3+ Fe(C5H5)2^+ Fe(CO)4^2- ' +
    'Fe(C10H12N2O8)^- Fe(C10H12N2O8)^2- Fe(NO)^2+ FeNO^2+ FeS2^- Fe(C6H5O7)^- FeBr4^-',
  'cobalt and nickel':
    'Co(NH3)6^2+ Co(NH3)6^3+ Co(NH3)5Cl^2+ Co(NH3)5(H2O)^3+ Co(NH3)4Cl2^+ Co(CN)6^3- Co(CN)6^4- Co(CN)5^3- CoCl4^2- CoCl^+ Co(SCN)4^2- ' +
    'Co(OH)3^- Co(OH)4^2- HCoO2^- CoO2^- CoO2^2- Co(H2O)6^2+ Co(H2O)6^3+ Co(NO2)6^3- CoF6^3- Co(C2O4)3^3- Co(CO)4^- CoOH^+ ' +
    'Co(C10H8N2)3^2+ Co(C10H8N2)3^3+ Co(C2H8N2)3^2+ Co(C2H8N2)3^3+ Co(C5H5)2^+ Co(C10H12N2O8)^- Co(C10H12N2O8)^2- CoBr4^2- ' +
    'Ni(NH3)4^2+ Ni(NH3)6^2+ Ni(CN)4^2- Ni(CN)4^3- Ni(CN)4^4- Ni2(CN)6^4- Ni(OH)3^- Ni(OH)4^2- NiOH^+ NiCl4^2- NiF6^2- Ni(H2O)6^2+ NiO2^- HNiO2^- NiO2^2- ' +
    'Ni(C2H8N2)3^2+ Ni(C10H12N2O8)^2- Ni(C5H5)2^+ NiCl^+ NiBr4^2- Ni4(OH)4^4+ Ni(C6H5O7)^-',
  'copper, silver, gold':
    'CuCl2^- CuCl3^2- CuCl4^2- CuCl4^3- CuCl^+ CuCl3^- CuBr2^- CuBr4^2- CuI2^- Cu(CN)2^- Cu(CN)3^2- Cu(CN)4^3- Cu(NH3)2^+ Cu(NH3)4^2+ Cu(NH3)6^2+ ' +
    'Cu(H2O)6^2+ Cu(H2O)4^2+ Cu(OH)3^- Cu(OH)4^2- Cu(OH)4^- CuO2^2- CuO2^- HCuO2^- CuOH^+ Cu2(OH)2^2+ Cu(P2O7)2^6- CuP2O7^2- Cu(P2O7)^2- ' +
    'Cu(C2O4)2^2- Cu(C2H8N2)2^2+ Cu(C10H12N2O8)^2- Cu(C4H4O6)2^2- Cu(C12H8N2)2^+ Cu(C12H8N2)2^2+ Cu(S2O3)2^3- Cu(SCN)2^- CuS^- ' +
    'Cu(CO3)2^2- Cu(C10H8N2)2^2+ Cu(C10H8N2)2^+ Ag(CN)2^- Ag(CN)3^2- Ag(CN)4^3- Ag(NH3)2^+ AgCl2^- AgCl3^2- AgCl4^3- AgBr2^- ' +
    'AgI2^- AgI3^2- AgI4^3- Ag(S2O3)2^3- AgS2O3^- Ag(S2O3)^- Ag(S2O3)3^5- Ag(SO3)2^3- Ag(SCN)2^- Ag(SCN)4^3- AgO^- AgO^+ Ag(OH)2^- AgOH^+ ' +
    'AgS^- Ag(NH3)^+ Ag2I^+ AuCl2^- AuCl4^- AuBr2^- AuBr4^- AuI2^- AuI4^- Au(CN)2^- Au(CN)4^- Au(SCN)2^- Au(SCN)4^- Au(S2O3)2^3- ' +
    'Au(SO3)2^3- Au(NH3)2^+ Au(NH3)4^3+ Au(OH)4^- HAuO3^2- H2AuO3^- AuO3^3- AuO2^- Au(CS(NH2)2)2^+ Ag(CS(NH2)2)3^+ Au(SC(NH2)2)2^+ ' +
    'Ag(SC(NH2)2)3^+ Cu(SC(NH2)2)4^+ Au(OH)2^- AuCl3OH^-',
  'zinc, cadmium, mercury':
    'Zn(OH)4^2- Zn(OH)3^- ZnO2^2- HZnO2^- ZnOH^+ Zn(NH3)4^2+ Zn(NH3)6^2+ Zn(CN)4^2- ZnCl4^2- ZnCl3^- ZnCl^+ ZnBr4^2- ZnI4^2- Zn(H2O)6^2+ ' +
    'Zn(SCN)4^2- Zn(P2O7)2^6- Zn(C2O4)2^2- Zn(C10H12N2O8)^2- Cd(OH)4^2- Cd(OH)3^- CdO2^2- HCdO2^- CdOH^+ Cd(NH3)4^2+ Cd(NH3)6^2+ Cd(CN)4^2- CdCl4^2- ' +
    'CdCl3^- CdCl^+ CdBr4^2- CdI4^2- CdI3^- Cd(H2O)6^2+ Hg(CN)4^2- HgCl4^2- HgCl3^- HgCl^+ HgBr4^2- HgBr3^- HgI4^2- HgI3^- Hg(NH3)4^2+ ' +
    'HgS2^2- Hg(SCN)4^2- Hg(OH)^+ HgOH^+ HgO2^2- HHgO2^- Hg2OH^+ HgNH2^+ Hg3^2+ Hg2N^+ Hg(S2O3)2^2- Zn(C4H4O6)2^2-',
  'platinum metals':
    'PtCl4^2- PtCl6^2- PtBr4^2- PtBr6^2- PtI6^2- PtI4^2- Pt(CN)4^2- Pt(CN)6^2- Pt(NH3)4^2+ Pt(NH3)6^4+ Pt(OH)6^2- Pt(NO2)4^2- PtF6^- PtF6^2- PtCl3(C2H4)^- ' +
    'PtCl3(H2O)^- Pt(SCN)4^2- PdCl4^2- PdCl6^2- PdBr4^2- PdI4^2- Pd(CN)4^2- Pd(NH3)4^2+ PdBr6^2- Pd(OH)4^2- Pd(NO2)4^2- RhCl6^3- Rh(NH3)6^3+ ' +
    'Rh(CN)6^3- Rh(H2O)6^3+ RhCl6^2- IrCl6^2- IrCl6^3- IrBr6^2- IrBr6^3- IrCl6^4- IrO4^2- IrF6^- RuO4^- RuO4^2- RuCl6^3- RuCl6^2- Ru(NH3)6^2+ ' +
    'Ru(NH3)6^3+ Ru(CN)6^3- Ru(CN)6^4- Ru(H2O)6^2+ Ru(H2O)6^3+ Ru(C10H8N2)3^2+ Ru(C10H8N2)3^3+ Ru(C10H8N2)3^+ RuCl5NO^2- RuO2^2+ Ru(NH3)5Cl^2+ ' +
    'OsO4^2- OsO4(OH)2^2- OsCl6^2- OsCl6^3- OsO2(OH)4^2- HOsO5^- Os(CN)6^4- Os(CN)6^3- Os(C10H8N2)3^2+ Os(C10H8N2)3^3+ Os(NH3)6^3+ OsO3N^- OsBr6^2-',
  'lanthanoids and actinoids with ligands':
    'UO2^+ UO2^2+ UO4^2- U2O7^2- UF6^- UF6^2- UCl6^2- UCl6^- UO2Cl4^2- UO2(CO3)3^4- UO2(CO3)2^2- UOH^3+ UO2OH^+ NpO2^+ NpO2^2+ NpO5^3- PuO2^+ PuO2^2+ ' +
    'PuO5^3- AmO2^+ AmO2^2+ PaO2^+ CeOH^3+ Ce(NO3)6^2- Ce(SO4)3^2- CeF6^2- ThF6^2- Th(NO3)6^2- LaF6^3- CeCl6^2- PaO^3+ CeF2^2+ EuCl6^3- PuCl6^2- CeOH^2+',
  'noble gases and rare names': 'XeF^+ XeF3^+ XeF5^+ HXeO4^- XeO6^4- HXeO6^3- H2XeO6^2- HXeO6^4- KrF^+ ArH^+ HeH^+',
};

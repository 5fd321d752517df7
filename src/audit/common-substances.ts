/**
 * Ions of everyday electrode reactions: those of the published tables of standard potentials (Bard, Parsons and Jordan
 * 1985; CRC Handbook) with their conjugate acids and bases, and the complexes of plating and analysis; from memory. The
 * long table of known ions holds rarer ones too, which a slip of the pen produces more often than a chemist means them.
 */
export const COMMON_IONS = `
  H^+ H3O^+ OH^- D^+ HO2^- O2^- F^- HF2^- Cl^- ClO^- ClO2^- ClO3^- ClO4^- Br^- Br3^- BrO^- BrO3^- BrO4^- I^- I3^- IO^- IO3^- IO4^-
  ICl2^- IBr2^- HS^- S^2- S2^2- S3^2- S4^2- S5^2- SO4^2- HSO4^- SO3^2- HSO3^- HSO5^- S2O3^2- S2O4^2- HS2O4^- S2O5^2- S2O6^2- S2O8^2-
  S4O6^2- SCN^- Se^2- HSe^- SeO4^2- HSeO4^- SeO3^2- HSeO3^- Te^2- TeO3^2- TeO4^2- Te(OH)3^+ NO3^- NO2^- NH4^+ NH3OH^+ N2H5^+ N2O2^2- N3^-
  PO4^3- HPO4^2- H2PO4^- HPO3^2- H2PO2^- P2O7^4- AsO4^3- HAsO4^2- H2AsO4^- AsO3^3- H2AsO3^- AsO2^- As(OH)4^- SbO^+ SbO2^- Sb(OH)4^-
  Sb(OH)6^- Sb^3+ BiO^+ Bi^3+ BiCl4^- CO3^2- HCO3^- HCOO^- CH3COO^- C2O4^2- HC2O4^- C6H5O^- OCN^- CN^- B(OH)4^- BO2^- BH4^- BF4^-
  SiF6^2- SiO3^2- Li^+ Na^+ K^+ Rb^+ Cs^+ Be^2+ Mg^2+ Ca^2+ Sr^2+ Ba^2+ Ra^2+ Al^3+ Al(OH)4^- AlO2^- AlF6^3- AlCl4^- Al2Cl7^-
  Ga^3+ In^3+ In^+ Tl^+ Tl^3+ Sn^2+ Sn^4+ HSnO2^- Sn(OH)3^- Sn(OH)4^2- Sn(OH)6^2- SnCl4^2- SnCl6^2- Pb^2+ Pb^4+ HPbO2^- Pb(OH)3^- Pb(OH)4^2-
  PbCl4^2- Cu^2+ Cu^+ Cu(CN)2^- Cu(CN)3^2- Cu(CN)4^3- Cu(NH3)4^2+ Cu(NH3)2^+ CuCl2^- CuCl4^2- Ag^+ Ag^2+ Ag(CN)2^- Ag(NH3)2^+
  Ag(S2O3)2^3- Au^3+ Au^+ AuCl4^- AuCl2^- AuBr4^- AuBr2^- Au(CN)2^- Zn^2+ Zn(OH)4^2- ZnO2^2- Zn(NH3)4^2+ Zn(CN)4^2- ZnCl4^2- Cd^2+
  Cd(OH)4^2- Cd(NH3)4^2+ Cd(CN)4^2- Hg2^2+ Hg^2+ HgCl4^2- HgBr4^2- HgI4^2- Hg(CN)4^2- Sc^3+ Y^3+ La^3+ Ce^3+ Ce^4+ Pr^3+ Nd^3+
  Sm^3+ Sm^2+ Eu^3+ Eu^2+ Gd^3+ Dy^3+ Ho^3+ Er^3+ Yb^3+ Yb^2+ Ti^2+ Ti^3+ TiO^2+ TiCl6^2- Zr^4+ V^2+ V^3+ VO^2+ VO2^+ VO3^- VO4^3-
  Cr^2+ Cr^3+ CrO4^2- Cr2O7^2- HCrO4^- Cr(OH)4^- CrO2^- MoO4^2- WO4^2- Mo(CN)8^3- Mo(CN)8^4- W(CN)8^3- W(CN)8^4- Mn^2+ Mn^3+ MnO4^-
  MnO4^2- MnO4^3- Mn(CN)6^3- Mn(CN)6^4- TcO4^- ReO4^- Fe^2+ Fe^3+ FeO4^2- FeO2^- HFeO2^- FeOH^2+ FeCl4^- Fe(CN)6^3- Fe(CN)6^4-
  Fe(SCN)^2+ Fe(C10H8N2)3^3+ Fe(C10H8N2)3^2+ Fe(C12H8N2)3^3+ Fe(C12H8N2)3^2+ Fe(C5H5)2^+ Co^2+ Co^3+ Co(NH3)6^3+ Co(NH3)6^2+ CoCl4^2-
  Co(CN)6^3- Co(CN)6^4- Ni^2+ Ni(NH3)6^2+ Ni(CN)4^2- Ru^3+ Ru^2+ RuO4^- RuO4^2- Ru(NH3)6^3+ Ru(NH3)6^2+ Ru(CN)6^3- Ru(CN)6^4- Rh^3+
  RhCl6^3- Pd^2+ PdCl4^2- PdCl6^2- IrCl6^2- IrCl6^3- Ir^3+ Pt^2+ PtCl4^2- PtCl6^2- Th^4+ U^3+ U^4+ UO2^+ UO2^2+ Np^3+ Np^4+ NpO2^+
  NpO2^2+ Pu^3+ Pu^4+ PuO2^+ PuO2^2+ Am^3+ NbF7^2- TaF7^2- ZrF6^2- TiF6^2-
`;

/**
 * Substances of electrode reactions that are no ions, in plain spelling: elements as they stand,
 * gases, acids, oxides, hydroxides, salts and simple organic molecules. Common practice, no source; a species that is
 * missing here is not wrong, only less readily taken for what a mistyped one was meant to be.
 */
export const COMMON_SUBSTANCES = `
  H2 D2 N2 O2 O3 F2 Cl2 Br2 I2 S S8 P P4 C He Ar
  Li Be B Na Mg Al Si K Ca Sc Ti V Cr Mn Fe Co Ni Cu Zn Ga Ge As Se Rb Sr Y Zr Nb Mo Tc Ru Rh Pd Ag Cd In Sn Sb Te Cs Ba
  La Ce Pr Nd Pm Sm Eu Gd Tb Dy Ho Er Tm Yb Lu Hf Ta W Re Os Ir Pt Au Hg Tl Pb Bi Po Ra Ac Th Pa U Np Pu Am Cm
  H2O H2O2 NH3 N2H4 NH2OH NO NO2 N2O N2O4 N2O5 HNO2 HNO3 HN3 CO CO2 SO2 SO3 H2S H2Se H2Te PH3 AsH3 SbH3 SiH4 ClO2
  HF HCl HBr HI HClO HClO2 HClO3 HClO4 HBrO HIO HIO3 H5IO6 HCN (CN)2 HNCO (SCN)2 H2SO3 H2SO4 H2S2O3
  H3PO2 H3PO3 H3PO4 H3AsO3 H3AsO4 HAsO2 H2SeO3 H2SeO4 H2TeO3 H3BO3 H2CO3 H2C2O4 HCOOH CH3COOH HCHO CH3OH CH4 C2H2 C2H4
  C2H6 C2H5OH CH3CHO CH3CH2OH CH3COCH3 C3H8 C6H6 C6H12O6 C6H4O2 C6H6O2 CO(NH2)2
  MnO MnO2 Mn2O3 Mn3O4 Mn2O7 MnOOH MnS Mn(OH)2 MnCO3 FeO Fe2O3 Fe3O4 FeS FeS2 FeOOH Fe(OH)2 Fe(OH)3 FeCO3 FeSO4 FeCl2
  FeCl3 CoO Co3O4 CoOOH Co(OH)2 Co(OH)3 NiO NiO2 NiOOH Ni(OH)2 NiCO3 CuO Cu2O CuS Cu2S CuCl CuBr CuI CuSCN Cu(OH)2 CuSO4
  CuCl2 CuCO3 CuFeS2 ZnO ZnS Zn(OH)2 ZnCO3 ZnSO4 ZnCl2 CdO CdS Cd(OH)2 CdCO3 HgO HgS Hg2Cl2 Hg2Br2 Hg2I2 Hg2SO4 Hg2CO3
  HgCl2 Ag2O AgO Ag2O3 AgCl AgBr AgI AgSCN AgCN AgN3 Ag2S Ag2SO4 Ag2CO3 Ag2CrO4 AgNO3 AgIO3 AgBrO3 AgNO2 AgCH3COO Ag2C2O4 Ag2MoO4 Ag2WO4 Hg2HPO4 Hg2(IO3)2 Hg2(CH3COO)2 H2N2O2 PbO PbO2 Pb3O4 PbS
  PbSO4 PbCl2 PbBr2 PbI2 PbF2 PbCO3 PbHPO4 Pb(OH)2 SnO SnO2 SnS SnCl2 SnCl4 Sn(OH)2 Cr2O3 CrO3 Cr(OH)3 CrCl3 V2O5 V2O3
  VO2 TiO2 ZrO2 HfO2 Nb2O5 Ta2O5 MoO2 MoO3 WO2 WO3 W2O5 TcO2 ReO2 RuO4 RuO2 OsO4 IrO2 Au(OH)3 Au2O3 Pt(OH)2 PtO2 Pd(OH)2
  PdO Al2O3 Al(OH)3 AlCl3 Mg(OH)2 MgO MgCl2 Ca(OH)2 CaO CaCl2 CaCO3 BaO BaSO4 BeO B2O3 SiO2 GeO2 Bi2O3 BiOCl Bi(OH)3 Sb2O3
  Sb4O6 Sb2O5 As2O3 As4O6 As2S3 TlCl TlBr TlI Tl2SO4 ThO2 UO2 U3O8 UO3 TeO2 SeO2 P4O10 P4O6
  NaCl NaOH Na2CO3 Na2SO4 NaHCO3 NaClO KCl KOH KI KMnO4 K2MnO4 K2Cr2O7 K2CrO4 KNO3 KClO3 KIO3 KBr LiCl LiCoO2 LiFePO4
  FePO4 NH4Cl NH4NO3 Fe(C5H5)2
  Li2SO4 K2SO4 (NH4)2SO4 MgSO4 CaSO4 MnSO4 CoSO4 NiSO4 CdSO4 SnSO4 Al2(SO4)3 Fe2(SO4)3 Cr2(SO4)3 NaHSO4 KHSO4
  BaCl2 MnCl2 CoCl2 NiCl2 CdCl2 NaBr NaI NaF KF LiOH Ba(OH)2 Sr(OH)2 Na2O Na2O2 K2O Li2O Na2S K2S Na2SO3 Na2S2O3
  Na2S4O6 K2S2O8 Na2S2O8 (NH4)2S2O8 K2CO3 Li2CO3 MgCO3 NaNO3 NaNO2 LiNO3 Mg(NO3)2 Ca(NO3)2 Ba(NO3)2 Al(NO3)3 Mn(NO3)2
  Fe(NO3)2 Fe(NO3)3 Co(NO3)2 Ni(NO3)2 Cu(NO3)2 Zn(NO3)2 Cd(NO3)2 Pb(NO3)2 Na3PO4 K3PO4 Ca3(PO4)2 NaClO2 NaClO3 NaClO4
  KClO4 KBrO3 NaCN KCN KSCN K3Fe(CN)6 K4Fe(CN)6 Na2C2O4 K2C2O4 Na2CrO4 Na2Cr2O7 NaAlO2 Na3AlF6 CaF2
`;

/** Real species that are seldom meant where they are written: atoms and radicals. */
export const RARE_SPECIES = 'H O N F Cl Br I OH HO2 NO3 ClO3 SO4 CN NH4';

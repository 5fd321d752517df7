/** Plain spellings of known ions. */
export const IONS_TEXT = `
  H^+ OH^- H^- HO2^- O2^- F^- Cl^- ClO^- ClO2^- ClO3^- ClO4^- Br^- Br3^- BrO^- BrO3^- BrO4^- I^- I3^- IO^-
  IO3^- IO4^- ICl2^- IBr2^- HS^- S^2- S2^2- SO4^2- SO3^2- S2O3^2- S2O4^2- S2O6^2- S2O8^2- HSO4^- S4O6^2- SCN^-
  Se^2- SeO4^2- SeO3^2- Te(OH)3^+ NO3^- NH4^+ NO2^- NH3OH^+ N2H5^+ N2O2^2- PO4^3- HPO3^2- H2PO2^- AsO4^3-
  AsO2^- SbO^+ SbO2^- BiO^+ Bi^3+ BiCl4^- HCOO^- C2O4^2- CO3^2- OCN^- CN^- B(OH)4^- BH4^- BF4^- SiF6^2- Li^+
  Na^+ K^+ Rb^+ Cs^+ Be^2+ Mg^2+ Ca^2+ Sr^2+ Ba^2+ Ra^2+ Al^3+ Al(OH)4^- AlF6^3- Ga^3+ In^3+ In^+ Tl^+ Tl^3+
  Sn^2+ Sn^4+ HSnO2^- Sn(OH)6^2- Pb^2+ Pb^4+ HPO4^2- HPbO2^- Cu^2+ Cu^+ Cu(CN)2^- Cu(NH3)4^2+ Cu(NH3)2^+ Ag^+
  Ag^2+ CrO4^2- MoO4^2- WO4^2- CH3COO^- N3^- Ag(CN)2^- Ag(NH3)2^+ Ag(S2O3)2^3- Au^3+ Au^+ AuCl4^- AuCl2^-
  AuBr4^- AuBr2^- Au(CN)2^- Zn^2+ Zn(OH)4^2- Zn(NH3)4^2+ Zn(CN)4^2- Cd^2+ Cd(OH)4^2- Cd(NH3)4^2+ Cd(CN)4^2-
  Hg2^2+ Hg^2+ H2PO4^- HgCl4^2- HgBr4^2- HgI4^2- Hg(CN)4^2- Sc^3+ Y^3+ La^3+ Ce^3+ Ce^4+ Pr^3+ Nd^3+ Sm^3+
  Sm^2+ Eu^3+ Eu^2+ Gd^3+ Dy^3+ Ho^3+ Er^3+ Yb^3+ Yb^2+ Ti^2+ Ti^3+ TiO^2+ V^2+ V^3+ VO^2+ VO2^+ Cr^2+ Cr^3+
  Cr2O7^2- HCrO4^- TcO4^- ReO4^- Mn^2+ Mn^3+ MnO4^- MnO4^2- MnO4^3- Fe^2+ Fe^3+ FeO4^2- Fe(CN)6^3- Fe(CN)6^4-
  Fe(C10H8N2)3^3+ Fe(C10H8N2)3^2+ Fe(C12H8N2)3^3+ Fe(C12H8N2)3^2+ Fe(C5H5)2^+ Co^2+ Co^3+ Co(NH3)6^3+
  Co(NH3)6^2+ Ni^2+ Ni(NH3)6^2+ Ru^3+ Ru^2+ RuO4^- RuO4^2- Ru(NH3)6^3+ Ru(NH3)6^2+ Rh^3+ RhCl6^3- Pd^2+
  PdCl4^2- PdCl6^2- IrCl6^2- IrCl6^3- Ir^3+ Pt^2+ PtCl4^2- PtCl6^2- Th^4+ U^3+ U^4+ UO2^+ UO2^2+ Np^3+ Np^4+
  NpO2^+ NpO2^2+ Pu^3+ Pu^4+ PuO2^+ PuO2^2+ Am^3+ Mo(CN)8^3- Mo(CN)8^4- W(CN)8^3- W(CN)8^4- Mn(CN)6^3-
  Mn(CN)6^4- Ru(CN)6^3- Ru(CN)6^4- HF2^- S3^2- S4^2- S5^2- HSO3^- HS2O4^- HSe^- HSeO3^- HSeO4^- H2AsO3^-
  H2AsO4^- HAsO4^2- HCO3^- HC2O4^-
`;

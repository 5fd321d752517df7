/** One row of the table of cautions. */
export interface CautionRow {
  /**
   * When the row speaks: `key=value|value;key=value`, where `;` means and, `|` means or. Keys: `any` (a species anywhere
   * in the cell), `with` (another species also present), `reactant`, `product`, `anode`, `cathode`, `anode_product`,
   * `cathode_product`, `element` (in any species), `medium` (acid, base, neutral, molten, nonaqueous), `mode`
   * (electrolysis, galvanic, charging), `condition` (what only the user can say: it is named with the caution).
   */
  readonly trigger: string;
  readonly text: string;
  /** The published limit, standard or classification behind it. */
  readonly basis: string;
}

/**
 * Cautions for electrode processes. Every row was typed from memory of the basis it names; that a hazard is missing
 * here does not mean that there is none. Local codes, the SDS and licensed practice come before this table.
 */
export const CAUTION_ROWS: readonly CautionRow[] = [
  {
    trigger:
      'any=CN^-(aq)|HCN(aq)|AgCN(s)|Ag(CN)2^-(aq)|Au(CN)2^-(aq)|Cu(CN)2^-(aq)|Zn(CN)4^2-(aq)|Cd(CN)4^2-(aq)|Hg(CN)4^2-(aq);medium=acid|neutral',
    text: 'Cyanide below about pH 11 gives off hydrogen cyanide, which can kill within minutes and which many people cannot smell. Do not run this outside a licensed facility with HCN monitoring, antidote planning and local authorisation.',
    basis: 'GHS acute toxicity category 1 to 2; OSHA PEL 10 ppm (skin)',
  },
  {
    trigger:
      'any=CN^-(aq)|AgCN(s)|Ag(CN)2^-(aq)|Au(CN)2^-(aq)|Cu(CN)2^-(aq)|Zn(CN)4^2-(aq)|Cd(CN)4^2-(aq)|Hg(CN)4^2-(aq);medium=base',
    text: 'Even alkaline cyanide baths poison by skin, mouth and mist, and carbon dioxide from air or local acid at an anode can lower the pH. Work only under the SDS, permits and trained supervision that apply to cyanide plating.',
    basis: 'GHS acute toxicity 1 to 2; OSHA PEL 5 mg/m3 as CN (skin)',
  },
  {
    trigger: 'any=CN^-(aq);with=ClO^-(aq)|HClO(aq)|Cl2(g)',
    text: 'Chlorine or hypochlorite acting on cyanide can release cyanogen chloride, a severe lung and tear agent, unless the pH is kept high throughout. Destruction of cyanide belongs to licensed waste handling.',
    basis: 'ACGIH ceiling 0.3 ppm for cyanogen chloride; GHS acute toxicity 1 to 2',
  },
  {
    trigger: 'any=(CN)2(g)',
    text: 'Cyanogen is a highly toxic, flammable gas that hydrolyses to cyanide. Use only with gas detection and exhaust as the SDS and local code require.',
    basis: 'ACGIH ceiling (5 ppm); flammable about 6 to 32 % in air; GHS flammable gas 1',
  },
  {
    trigger: 'any=Fe(CN)6^3-(aq)|Fe(CN)6^4-(aq);medium=acid;condition=hot|strong-acid|strong-light',
    text: 'Hexacyanoferrates are mild when cold and neutral, but hot strong acid or strong light can set hydrogen cyanide free. Keep them away from concentrated acid and follow the SDS.',
    basis: 'EU CLP EUH032 statement; OSHA PEL for HCN 10 ppm',
  },
  {
    trigger: 'anode_product=Cl2(g);mode=electrolysis|charging',
    text: 'Chloride at an inert anode can yield chlorine, a corrosive lung irritant that is heavier than air, even where oxygen looks favoured by the potentials. Use exhaust, scrubbing and the exposure limits in force locally.',
    basis: 'OSHA PEL ceiling 1 ppm; NIOSH IDLH 10 ppm; GHS acute toxicity 2',
  },
  {
    trigger: 'any=ClO^-(aq)|HClO(aq);medium=acid',
    text: 'Acidified hypochlorite in the presence of chloride releases chlorine gas. Never add acid to bleach, and ventilate as the SDS directs.',
    basis: 'EU CLP EUH031 statement; OSHA PEL ceiling 1 ppm for Cl2',
  },
  {
    trigger: 'any=ClO^-(aq)|HClO(aq)|Cl2(g);with=NH3(aq)|NH4^+(aq)|NH3(g)',
    text: 'Ammonia or ammonium with hypochlorite or chlorine forms toxic chloramines and may go on to explosive nitrogen trichloride. Do not combine these streams; see the SDS and local rules on incompatible storage.',
    basis: 'GHS acute toxicity; common incompatibility tables (NFPA 400)',
  },
  {
    trigger: 'anode_product=Cl2(g)|HClO(aq);with=NH4^+(aq);medium=acid',
    text: 'Electrolysing ammonium chloride at low pH can build up oily nitrogen trichloride, which explodes on shock, light or warming. Do not run this combination without expert, licensed safety review.',
    basis: 'Published explosion case reports; GHS unstable explosive',
  },
  {
    trigger: 'any=H2(g);with=O2(g)',
    text: 'Hydrogen burns in air from about 4 to 75-77 % and in oxygen from about 4 to 94-95 %, with an ignition energy near 0.02 mJ. Keep the two gases apart, vent high and outdoors, remove ignition sources and meet the local hydrogen code.',
    basis: 'ISO 10156 and NFPA 2/55 limits; IEC 60079-20-1',
  },
  {
    trigger: 'product=H2(g)',
    text: 'Hydrogen collects under ceilings and in hoods and burns with a flame that is nearly invisible by day. Size the ventilation so that the room stays well below one quarter of the lower limit, as the local code asks.',
    basis: 'NFPA 55, NFPA 2, ISO/TR 15916; lower limit about 4 % in air',
  },
  {
    trigger: 'product=H2(g);with=O2(g);condition=undivided-cell',
    text: 'An undivided water electrolysis cell makes an explosive mixture of two parts hydrogen to one part oxygen. Use a separator and separate gas lines, and do not store the mixed gas.',
    basis: 'ISO 10156; NFPA 55',
  },
  {
    trigger: 'product=H2(g)|O2(g)|Cl2(g);condition=closed-vessel',
    text: "Gas made in a sealed vessel raises the pressure until something bursts, at a rate fixed by Faraday's law. Provide a sized vent or relief designed under the pressure-equipment rules that apply.",
    basis: 'Pressure equipment law; ISO 4126 series',
  },
  {
    trigger: 'product=O2(g)',
    text: 'Oxygen above about 23.5 % in the surrounding air makes clothing, grease and plastics ignite easily and burn fiercely. Keep oils away, use oxygen-clean parts and ventilate to the local limit.',
    basis: 'NFPA 53/55; OSHA 1910.146 definition of enriched atmosphere; GHS oxidising gas 1',
  },
  {
    trigger: 'any=Pb(s)|PbO2(s);with=PbSO4(s);mode=charging',
    text: "Charging a lead-acid cell, above all overcharging, releases hydrogen, oxygen and acid mist. Ventilate so hydrogen stays under about 1 % and follow the battery-room code and the maker's charging limits.",
    basis: 'IEC 62485-2; IEEE 1635; NFPA 1 battery provisions',
  },
  {
    trigger: 'any=Pb(s)|PbO2(s);with=PbSO4(s);condition=overcharge|hot',
    text: 'A valve-regulated lead-acid battery charged while hot or ageing can draw ever more current and run away thermally. Use temperature-compensated charging and disconnect on a temperature or current alarm.',
    basis: 'IEC 62485-2; IEEE 1187/1188 guidance',
  },
  {
    trigger: 'any=PbO2(s)|PbSO4(s)|HSO4^-(aq);medium=acid;condition=concentrated',
    text: 'Battery-strength sulfuric acid burns skin and eyes, and adding water to it can make it boil and spit. Wear the protection in the SDS and always pour acid into water.',
    basis: 'GHS skin corrosion 1A; OSHA PEL 1 mg/m3 for mist',
  },
  {
    trigger: 'element=Pb',
    text: 'Lead and its compounds damage nerves, blood and unborn children and build up in the body. Keep dust and mist down, wash before eating and follow local lead-exposure and waste law.',
    basis: 'OSHA PEL 0.05 mg/m3 with action level 0.03; GHS reproductive toxicity 1A',
  },
  {
    trigger: 'element=Hg',
    text: 'Mercury vapour and soluble mercury salts are poisonous and persistent, and spilled metal keeps evaporating. Prefer another reference electrode; where it is allowed, use trays, monitoring and licensed disposal.',
    basis: 'OSHA ceiling 0.1 mg/m3; ACGIH 0.025 mg/m3; Minamata Convention',
  },
  {
    trigger: 'any=Hg(l)|Hg2^2+(aq)|Hg^2+(aq);with=Al(s)',
    text: 'Mercury breaks the oxide film on aluminium, which then corrodes rapidly and makes hydrogen and heat. Keep mercury cells away from aluminium structures and parts.',
    basis: 'Transport rules on mercury with aluminium (ICAO/IATA); SDS',
  },
  {
    trigger: 'element=Cd',
    text: 'Cadmium compounds cause cancer and kidney damage, and fumes from heating can kill with delay. Use closed handling and follow the SDS and the local cadmium standard.',
    basis: 'OSHA PEL 0.005 mg/m3 (1910.1027); IARC group 1',
  },
  {
    trigger: 'any=Cr2O7^2-(aq)|CrO4^2-(aq)|HCrO4^-(aq)',
    text: 'Hexavalent chromium causes lung cancer, ulcers and lasting skin allergy, and gas bubbles at the electrodes carry it into the air as mist. Use mist suppression, exhaust and the local legal limits, or choose another oxidant.',
    basis: 'OSHA PEL 0.005 mg/m3 (1910.1026); IARC group 1; REACH Annex XIV',
  },
  {
    trigger:
      'any=Cr2O7^2-(aq)|CrO4^2-(aq)|HCrO4^-(aq);with=CH3OH(aq)|C2H5OH(aq)|CH3CHO(aq)|HCHO(aq)|CH3OH(l)|C2H5OH(l)',
    text: 'Acid chromate oxidises alcohols and aldehydes quickly and hot enough to ignite vapours. Do not mix except at the scale and cooling given in an approved procedure.',
    basis: 'GHS oxidising solid; NFPA 400 incompatibility',
  },
  {
    trigger: 'any=AsH3(g)|As(s)|H3AsO4(aq)|HAsO2(aq)|AsO2^-(aq)|AsO4^3-(aq);mode=electrolysis',
    text: 'Arsenic species at a hydrogen-evolving cathode, or with zinc or aluminium in acid or alkali, can form arsine, which destroys red blood cells at a few ppm. Do not run without arsine monitoring and expert review.',
    basis: 'OSHA PEL 0.05 ppm; GHS acute toxicity 1, flammable gas 1',
  },
  {
    trigger: 'element=As',
    text: 'Inorganic arsenic is acutely toxic and causes cancer in people. Follow the arsenic standard in force and treat all residues as hazardous waste.',
    basis: 'OSHA PEL 0.010 mg/m3 (1910.1018); IARC group 1',
  },
  {
    trigger: 'any=SbH3(g)|Sb(s)|SbO^+(aq)|SbO2^-(aq)|Sb4O6(s);mode=electrolysis|charging',
    text: 'Antimony at a hydrogen-evolving cathode can give stibine, a toxic and unstable gas; overcharged batteries with antimonial grids do this too. Ventilate, limit overcharge and check against the legal exposure limit.',
    basis: 'OSHA PEL 0.1 ppm; GHS acute toxicity',
  },
  {
    trigger: 'any=PH3(g)|P(s)|P(s,red)|H2PO2^-(aq)|H3PO2(aq)',
    text: 'Reduction or heating of phosphorus and hypophosphite can yield phosphine, a deadly gas that may catch fire by itself when diphosphane is present. Use inert gas, detection and the controls named in the SDS.',
    basis: 'OSHA PEL 0.3 ppm; lower flammable limit about 1.6 to 1.8 %; GHS acute toxicity 1',
  },
  {
    trigger: 'any=P(s)',
    text: 'White phosphorus ignites in air near room temperature and burns deep into skin. It must stay under water and be handled only by trained staff under the permits that apply.',
    basis: 'GHS pyrophoric solid 1, acute toxicity 2',
  },
  {
    trigger: 'any=SiH4(g)',
    text: 'Silane usually ignites on contact with air, and a delayed ignition explodes. Design cylinders and vents to the silane code.',
    basis: 'GHS flammable gas 1, pyrophoric; CGA G-13',
  },
  {
    trigger: 'any=H2S(g)|H2S(aq)',
    text: 'Hydrogen sulfide deadens the sense of smell just as it becomes dangerous and kills quickly at several hundred ppm. Monitor the air, scrub the exhaust and observe the local limit.',
    basis: 'OSHA ceiling 20 ppm; NIOSH IDLH 100 ppm; flammable 4 to 46 %',
  },
  {
    trigger: 'any=S^2-(aq)|HS^-(aq)|S2^2-(aq)|FeS(s)|ZnS(s)|CdS(s)|PbS(s)|Ag2S(s)|Cu2S(s)|HgS(s);medium=acid',
    text: 'Acid on sulfides releases hydrogen sulfide; the more soluble sulfides do so at once. Keep acid and sulfide streams apart and follow the SDS.',
    basis: 'EU CLP EUH031 statement; OSHA ceiling 20 ppm',
  },
  {
    trigger: 'any=H2Se(aq)|Se^2-(aq)|Se(s);medium=acid;mode=electrolysis',
    text: 'Selenium reduced in acid can form hydrogen selenide, one of the most toxic inorganic gases. Avoid the combination or use detection and scrubbing under expert control.',
    basis: 'OSHA PEL 0.05 ppm; GHS acute toxicity 1 to 2',
  },
  {
    trigger: 'any=SO3^2-(aq)|HSO3^-(aq)|H2SO3(aq)|S2O3^2-(aq)|S2O4^2-(aq);medium=acid',
    text: 'Acidified sulfite, dithionite or thiosulfate gives off sulfur dioxide, which can trigger severe asthma. Vent the cell and check the limit set by local law.',
    basis: 'OSHA PEL 5 ppm; ACGIH STEL 0.25 ppm',
  },
  {
    trigger: 'any=S2O4^2-(aq);condition=damp-solid|hot',
    text: 'Solid dithionite heats itself when damp and may ignite while giving off sulfur dioxide. Store dry and cool as the SDS directs.',
    basis: 'GHS self-heating 1',
  },
  {
    trigger: 'any=AgN3(s)',
    text: 'Silver azide is a primary explosive that can go off from a scratch, heat or light when dry. Do not isolate it; leave this couple to specialist, licensed laboratories.',
    basis: 'GHS unstable explosive; explosives law',
  },
  {
    trigger: 'any=N3^-(aq)|HN3(aq);medium=acid',
    text: 'Acidified azide forms hydrazoic acid, an explosive and highly toxic vapour. Keep the pH high, use no metal fittings and follow the azide SDS.',
    basis: 'ACGIH ceiling 0.11 ppm for HN3; GHS acute toxicity',
  },
  {
    trigger: 'any=N3^-(aq)|HN3(aq);element=Pb|Cu|Ag|Hg',
    text: 'Azide slowly makes shock-sensitive deposits with lead, copper, silver and mercury, plumbing included. Never drain azide into metal pipes; use the approved waste route.',
    basis: 'GHS explosives; published accident reports',
  },
  {
    trigger: 'any=Ag(NH3)2^+(aq)|Ag2O(s);with=NH3(aq)',
    text: 'Ammoniacal silver left standing can deposit black fulminating silver, mostly the nitride, which explodes even when wet. Make only what is needed, acidify soon after use and never store it.',
    basis: 'Published explosion reports; GHS unstable explosive',
  },
  {
    trigger: 'any=Ag^+(aq)|Hg^2+(aq)|Hg2^2+(aq);with=C2H5OH(aq)|C2H5OH(l);medium=acid',
    text: 'Silver or mercury nitrate with nitric acid and ethanol can form explosive fulminates. Do not combine these reagents.',
    basis: 'GHS unstable explosive; NFPA 400 incompatibility',
  },
  {
    trigger: 'any=C2H2(g);element=Cu|Ag|Hg',
    text: 'Acetylene forms explosive acetylides with copper, silver and mercury, and can decompose alone under pressure. Choose compatible materials and obey the acetylene code.',
    basis: 'CGA G-1; NFPA 51; flammable about 2.3 to 100 %',
  },
  {
    trigger: 'any=I2(s)|I2(aq)|I3^-(aq);with=NH3(aq)',
    text: 'Iodine with concentrated ammonia precipitates nitrogen triiodide, which explodes at a touch when dry. Keep the two apart.',
    basis: 'GHS unstable explosive; published demonstration safety notes',
  },
  {
    trigger: 'any=HgO(s)|Hg^2+(aq);with=NH3(aq)',
    text: 'Mercury(II) and ammonia can build up an explosive nitrogen-mercury solid, so mercury gauges and ammonia must not meet. Seek specialist disposal if a deposit is found.',
    basis: 'Published accident reports; SDS for ammonia',
  },
  {
    trigger: 'any=ClO4^-(aq);with=CH3OH(aq)|CH3OH(l)|C2H5OH(aq)|C2H5OH(l)|CH3COOH(aq)|CH3CHO(aq)|Fe(C5H5)2(aq)',
    text: 'Perchlorate with organic solvent, electrolyte salt or cation can explode when heated, dried or concentrated. Use a fluoroborate or similar salt if possible and never evaporate to dryness.',
    basis: 'GHS oxidiser; NFPA 400; published bath explosions',
  },
  {
    trigger: 'any=ClO4^-(aq);medium=acid;condition=hot|concentrated',
    text: 'Hot or concentrated perchloric acid is a violent oxidiser and its vapour leaves explosive deposits in ordinary ducts. Use only in a wash-down hood built for it.',
    basis: 'NFPA 45; GHS oxidising liquid 1',
  },
  {
    trigger: 'any=ClO3^-(aq);medium=acid',
    text: 'Acidified chlorate gives explosive, toxic chlorine dioxide and may ignite organics and sulfur. Keep acid, fuel and ammonium salts away, as the SDS states.',
    basis: 'OSHA PEL 0.1 ppm for ClO2; GHS oxidising solid 1',
  },
  {
    trigger: 'any=ClO3^-(aq);with=NH4^+(aq)',
    text: 'Ammonium chlorate may crystallise from such mixtures and can explode without warning. Do not let the streams meet or dry.',
    basis: 'GHS explosive; NFPA 400',
  },
  {
    trigger: 'any=ClO2(g)|ClO2(aq)|ClO2^-(aq)|HClO2(aq)',
    text: 'Chlorine dioxide gas above roughly 10 % in air decomposes explosively and is toxic at tenths of a ppm. Keep it in dilute solution, dark and ventilated, within local law.',
    basis: 'OSHA PEL 0.1 ppm; GHS acute toxicity',
  },
  {
    trigger: 'any=BrO3^-(aq)|BrO4^-(aq)|IO3^-(aq)|IO4^-(aq)|H5IO6(aq)',
    text: 'Solid bromate and periodate salts feed fires and can explode when ground or heated with fuel; bromate may also cause cancer. Keep them wet or in dilute solution and apart from organics.',
    basis: 'GHS oxidising solid 1 to 2; IARC group 2B for potassium bromate',
  },
  {
    trigger: 'any=Br2(l)|Br2(aq)|Br3^-(aq)',
    text: 'Bromine burns skin on contact and its heavy vapour injures the lungs at very low levels. Work in a hood with thiosulfate at hand and the glove type named in the SDS.',
    basis: 'OSHA PEL 0.1 ppm; NIOSH IDLH 3 ppm; GHS skin corrosion 1A',
  },
  {
    trigger: 'any=I2(s)|I2(aq)',
    text: 'Iodine vapour irritates the eyes and lungs and corrodes metals. Cover the cell and ventilate to the local limit.',
    basis: 'OSHA ceiling 0.1 ppm; GHS acute toxicity 4',
  },
  {
    trigger: 'any=F2(g)',
    text: 'Fluorine attacks nearly everything including water, glass and flesh, often with fire. Only licensed plants with passivated metal systems should make or hold it.',
    basis: 'OSHA PEL 0.1 ppm; GHS oxidising gas 1, acute toxicity 1 to 2',
  },
  {
    trigger: 'any=HF(aq)|HF2^-(aq)',
    text: 'Hydrofluoric acid passes through skin, may hurt only hours later and can stop the heart by binding calcium. Have calcium gluconate gel and an agreed medical plan ready before any use.',
    basis: 'OSHA PEL 3 ppm; GHS acute toxicity 1 to 2, skin corrosion 1A',
  },
  {
    trigger: 'any=F^-(aq)|BF4^-(aq)|SiF6^2-(aq)|AlF6^3-(aq)|PbF2(s);medium=acid',
    text: 'Fluorides and fluoro complexes in acid contain or release hydrogen fluoride and also etch glass. Treat the solution as hydrofluoric acid and follow its SDS.',
    basis: 'OSHA PEL 3 ppm for HF, 2.5 mg/m3 as F',
  },
  {
    trigger: 'any=O3(g)',
    text: 'Ozone harms the lungs near 0.1 ppm and forms explosive ozonides with many organics. Destroy it catalytically in the exhaust and keep within the legal limit.',
    basis: 'OSHA PEL 0.1 ppm; NIOSH IDLH 5 ppm',
  },
  {
    trigger: 'anode_product=O2(g);medium=acid;condition=high-overpotential|pbo2-anode|diamond-anode',
    text: 'High-overpotential anodes in acid can make ozone and persulfate besides oxygen. Vent the anode gas and check for ozone.',
    basis: 'OSHA PEL 0.1 ppm; published electrochemical ozone work',
  },
  {
    trigger: 'any=NO(g)|N2O4(g)|HNO2(aq)',
    text: 'Nitric oxide turns to brown nitrogen dioxide in air, and lung swelling can follow many hours after a mild exposure. Use exhaust and seek medical watch after any inhalation.',
    basis: 'OSHA PEL 25 ppm NO, ceiling 5 ppm NO2; GHS acute toxicity 1 to 2',
  },
  {
    trigger: 'any=NO2^-(aq);medium=acid',
    text: 'Acid on nitrite releases nitrogen oxides, and nitrite with secondary amines can make cancer-causing nitrosamines. Keep acid and amines apart from nitrite.',
    basis: 'OSHA limits for NO and NO2; IARC group 2A for nitrosodiethylamine',
  },
  {
    trigger: 'any=NO3^-(aq);medium=acid;condition=concentrated|metal-dissolution',
    text: 'Metals dissolving in nitric acid give off toxic nitrogen oxides, and organics may react after a delay. Use a hood and never close the vessel.',
    basis: 'OSHA limits for NO and NO2; NFPA 400',
  },
  {
    trigger: 'any=N2O(g)',
    text: 'Nitrous oxide is an asphyxiant and anaesthetic, and it feeds fire and can decompose violently when hot under pressure. Ventilate and use clean, rated fittings.',
    basis: 'ACGIH 50 ppm; GHS oxidising gas 1',
  },
  {
    trigger: 'any=N2H4(aq)|N2H5^+(aq)',
    text: 'Hydrazine is absorbed through skin, is a suspected cause of cancer and decomposes violently on catalytic metals when concentrated. Choose dilute solutions and the controls in the SDS.',
    basis: 'OSHA PEL 1 ppm (skin); IARC group 2A; flammable about 4.7 to 100 %',
  },
  {
    trigger: 'any=NH2OH(aq)|NH3OH^+(aq);condition=concentrated|hot',
    text: 'Concentrated or heated hydroxylamine has detonated in plants, and iron salts speed its decay. Stay dilute and cool, keep metals out and follow the SDS.',
    basis: 'Published incident investigations; GHS heating may cause explosion',
  },
  {
    trigger: 'any=NH3(aq)|NH3(g)',
    text: 'Ammonia vapour burns eyes and lungs and is flammable in closed spaces between about 15 and 28 % (up to 33.6 % in some tables). Ventilate and follow the local limit.',
    basis: 'OSHA PEL 50 ppm; ISO 10156/IEC 60079-20-1',
  },
  {
    trigger: 'any=CO(g)',
    text: 'Carbon monoxide has no smell and poisons at a few hundred ppm; it is also flammable from about 11 to 74-77 %. Use a CO alarm and vent the cathode gas outdoors.',
    basis: 'OSHA PEL 50 ppm; ISO 10156/IEC 60079-20-1; GHS acute toxicity 3, reproductive toxicity 1A',
  },
  {
    trigger: 'any=CO(g);element=Ni',
    text: 'Carbon monoxide over fresh nickel near 50 to 150 C forms nickel carbonyl, one of the most poisonous volatile liquids known. Do not bring the two together without carbonyl monitoring and expert review.',
    basis: 'OSHA PEL 0.001 ppm; GHS acute toxicity 1',
  },
  {
    trigger: 'any=CO(g);element=Fe|Co|Mo|W',
    text: 'Carbon monoxide under pressure can strip iron, cobalt and related metals as toxic volatile carbonyls. Check gas lines and cylinders and follow the SDS.',
    basis: 'ACGIH 0.1 ppm for iron pentacarbonyl; ACGIH 0.1 mg/m3 as Co for cobalt carbonyl',
  },
  {
    trigger: 'any=CO2(g)|N2(g);condition=closed-room',
    text: 'Carbon dioxide or nitrogen leaking into a small room displaces oxygen, and carbon dioxide is itself harmful above a few per cent. Monitor oxygen and stay above 19.5 %.',
    basis: 'OSHA PEL 5000 ppm CO2; OSHA 1910.146 (19.5 % oxygen)',
  },
  {
    trigger: 'any=CH4(g)|C2H4(g)|C2H6(g)',
    text: 'Fuel gas from carbon dioxide reduction forms explosive mixtures with air from a few per cent upward. Keep the anode oxygen separate and vent safely under the gas code.',
    basis: 'ISO 10156/IEC 60079-20-1: methane about 4.4 to 17 %, ethylene 2.3 to 36 %',
  },
  {
    trigger: 'any=CH3OH(aq)|CH3OH(l)|C2H5OH(l)|CH3CHO(aq)',
    text: 'Methanol blinds and kills when swallowed or absorbed, and these liquids give flammable vapours that platinum black can ignite. Wet the catalyst, limit quantities and follow the flammable-liquids code.',
    basis: 'OSHA PEL 200 ppm methanol; NFPA 30; GHS flammable liquid 1 to 2',
  },
  {
    trigger: 'any=HCHO(aq)',
    text: 'Formaldehyde causes cancer and skin allergy and is an intermediate of methanol oxidation. Vent the cell and keep below the action level.',
    basis: 'OSHA PEL 0.75 ppm with STEL 2 ppm; IARC group 1',
  },
  {
    trigger: 'any=HCOOH(aq);condition=concentrated|closed-vessel',
    text: 'Concentrated formic acid burns skin and slowly breaks down to carbon monoxide or carbon dioxide, which has burst closed bottles. Use vented caps and the SDS.',
    basis: 'OSHA PEL 5 ppm; GHS skin corrosion 1A',
  },
  {
    trigger: 'any=H2C2O4(aq)|C2O4^2-(aq)',
    text: 'Oxalic acid and oxalates harm the kidneys, and dry silver oxalate can explode when heated. Avoid dust and dispose as the SDS directs.',
    basis: 'OSHA PEL 1 mg/m3; GHS acute toxicity 4',
  },
  {
    trigger: 'any=Li(s)|Na(s)|K(s)|Rb(s)|Cs(s)|Ca(s)|Sr(s)|Ba(s);with=H2O(l)',
    text: 'These metals react with water to give hydrogen, heat and caustic spray, and the heavier alkali metals ignite at once. The aqueous value is only a thermodynamic figure; do not attempt such a cell in water.',
    basis: 'GHS water-reactive 1 (emits flammable gas)',
  },
  {
    trigger: 'any=Li(s)|Na(s)|K(s)|Mg(s)|Al(s)|Ca(s);medium=molten',
    text: 'Molten metal or salt explodes into steam and spray on meeting moisture, and spilled metal burns through ordinary extinguishers. Dry everything, use a class D agent and follow local foundry rules.',
    basis: 'NFPA 484; GHS water-reactive 1',
  },
  {
    trigger: 'any=K(s)|Rb(s)|Cs(s);condition=aged|peroxide-crust',
    text: 'Old potassium and heavier alkali metals grow superoxide crusts that can detonate when cut under oil. Do not cut; call specialist disposal.',
    basis: 'Published accident reports; SDS',
  },
  {
    trigger: 'any=Li^+(aq)|Li(s);medium=nonaqueous;mode=charging',
    text: 'Lithium plated on a charging electrode may grow needles that short the cell and start a fire giving off hydrogen fluoride and flammable gas. Use rated cells, protection circuits and the battery code in force.',
    basis: 'IEC 62133-2; UN 38.3; NFPA 855',
  },
  {
    trigger: 'medium=nonaqueous;condition=organic-electrolyte',
    text: 'Organic electrolytes are flammable, and an aqueous standard potential cannot be carried over to them without a reference such as ferrocene. Exclude air and moisture as the SDS says.',
    basis: 'NFPA 30; IUPAC recommendation on the ferrocene reference',
  },
  {
    trigger: 'any=Mg(s)|Al(s)|Zn(s)|Zr(s)|Ti(s)|U(s)|Th(s);condition=powder|sponge-deposit',
    text: 'Fine or spongy electrodeposited metal can ignite in air or explode as dust, and water may make it worse. Keep it wet, small and grounded under the metal-dust code.',
    basis: 'NFPA 484; GHS flammable or pyrophoric solid',
  },
  {
    trigger: 'any=Al(s)|Zn(s)|Sn(s)|Si(s);medium=base',
    text: 'Aluminium, zinc and similar metals dissolve in strong alkali with hydrogen and much heat. Do not seal the vessel and add the metal slowly.',
    basis: 'GHS flammable gas evolution; NFPA 55',
  },
  {
    trigger: 'medium=base;condition=concentrated',
    text: 'Strong alkali blinds within seconds and heats greatly on dilution. Wear sealed goggles and follow the SDS.',
    basis: 'GHS skin corrosion 1A; OSHA PEL 2 mg/m3 for NaOH',
  },
  {
    trigger: 'medium=acid;condition=concentrated',
    text: 'Concentrated mineral acids burn tissue, and electrolysis bubbles carry acid mist into the breathing zone. Cover the cell, use exhaust and keep an eyewash close.',
    basis: 'GHS skin corrosion 1A; OSHA PEL 1 mg/m3 for sulfuric acid',
  },
  {
    trigger: 'any=H2O2(aq)|HO2^-(aq);condition=concentrated|alkaline|catalyst',
    text: 'Peroxide breaks down to oxygen and heat with metals, alkali or catalysts and has burst closed vessels; strong solutions ignite organics. Use vented containers and passivated parts.',
    basis: 'OSHA PEL 1 ppm; GHS oxidising liquid 1 to 2',
  },
  {
    trigger: 'any=H2O2(aq);with=CH3OH(aq)|C2H5OH(aq)|CH3CHO(aq)|CH3COOH(aq)',
    text: 'Concentrated peroxide with alcohols, acids or ketones can form explosive mixtures and peroxides. Do not mix outside an approved procedure.',
    basis: 'GHS oxidising liquid; NFPA 400',
  },
  {
    trigger: 'any=S2O8^2-(aq)',
    text: 'Peroxodisulfates feed fire, release oxygen when warmed and can sensitise the airways. Keep cool and dry, away from fuel and reducing agents.',
    basis: 'ACGIH 0.1 mg/m3; GHS oxidising solid 3, respiratory sensitiser 1',
  },
  {
    trigger: 'any=MnO4^-(aq);medium=acid;condition=concentrated',
    text: 'Permanganate in concentrated sulfuric acid forms an oily oxide that explodes and ignites organics. Never mix the two at high concentration.',
    basis: 'GHS oxidising solid 2; published accident reports',
  },
  {
    trigger: 'any=MnO4^-(aq);with=Cl^-(aq);medium=acid',
    text: 'Acid permanganate oxidises chloride to chlorine. Use sulfuric acid instead and ventilate.',
    basis: 'OSHA PEL ceiling 1 ppm for Cl2',
  },
  {
    trigger: 'element=Ni',
    text: 'Nickel salts and mists sensitise skin and are classed as causing cancer in people. Avoid skin contact and mist, and keep to the local limit.',
    basis: 'OSHA PEL 1 mg/m3 as Ni; IARC group 1',
  },
  {
    trigger: 'element=Co',
    text: 'Cobalt salts sensitise skin and lungs, and some are presumed to cause cancer. Use gloves, suppress mist and consult the SDS.',
    basis: 'ACGIH 0.02 mg/m3; IARC 2A for soluble cobalt(II) salts',
  },
  {
    trigger: 'element=Be',
    text: 'Beryllium dust or mist can cause lifelong lung disease after small exposures. Leave such work to facilities that meet the beryllium standard.',
    basis: 'OSHA PEL 0.0002 mg/m3 (1910.1024); IARC group 1',
  },
  {
    trigger: 'element=Tl',
    text: 'Thallium is a cumulative poison taken up through intact skin. Substitute another metal where possible and treat all waste as highly toxic.',
    basis: 'OSHA PEL 0.1 mg/m3 (skin); GHS acute toxicity 2',
  },
  {
    trigger: 'any=OsO4(s)|RuO4(aq)',
    text: 'Osmium and ruthenium tetroxides are volatile, blind the eye and oxidise organics, ruthenium tetroxide sometimes explosively. Keep cold in sealed secondary containment in a hood.',
    basis: 'OSHA PEL 0.002 mg/m3 as Os; GHS acute toxicity 1 to 2',
  },
  {
    trigger: 'any=V2O5(s)|VO2^+(aq)|VO^2+(aq)',
    text: 'Vanadium(V) compounds irritate the airways and are suspected of causing genetic and reproductive harm. Prevent dust and mist and contain large flow-battery electrolyte volumes.',
    basis: 'OSHA ceiling 0.5 mg/m3 (dust); IARC group 2B for V2O5',
  },
  {
    trigger: 'element=U|Th|Np|Pu|Am|Ra|Tc',
    text: 'These elements are radioactive as well as chemically toxic, and their possession is licensed. Work only under a radiation-protection programme and nuclear material law.',
    basis: 'ICRP recommendations; IAEA safety standards; OSHA PEL 0.05 mg/m3 soluble U',
  },
  {
    trigger: 'any=BH4^-(aq);medium=acid|neutral',
    text: 'Borohydride gives off hydrogen rapidly as soon as the alkali is lost, and metal catalysts make it faster. Keep strongly basic, vented and away from acid.',
    basis: 'GHS water-reactive 1; NFPA 55',
  },
  {
    trigger: 'cathode=Pt(s)|Pd(s)|Ni(s);with=H2(g)',
    text: 'Platinum, palladium or Raney-type nickel holding hydrogen can glow and ignite hydrogen or solvent vapour on exposure to air. Flush with inert gas and keep the metal wet.',
    basis: 'Published laboratory accident reports; NFPA 55',
  },
  {
    trigger: 'any=FeO4^2-(aq);medium=acid|neutral',
    text: 'Ferrate decomposes quickly away from strong alkali and releases oxygen and heat. Keep small, cold and vented.',
    basis: 'GHS oxidising solid; SDS',
  },
  {
    trigger: 'any=Fe(OH)2(s);condition=alkaline-battery-charging',
    text: 'Iron and nickel-iron electrodes make hydrogen throughout charging and on standing. Ventilate as for any vented battery.',
    basis: 'IEC 62485-2',
  },
  {
    trigger: 'any=Zn(s);with=MnO2(s);mode=charging',
    text: 'Charging a primary zinc-manganese cell may burst it and spray caustic. Recharge only cells made for it.',
    basis: 'IEC 60086-5',
  },
  {
    trigger: 'any=Ni(OH)2(s)|NiOOH(s)|Cd(OH)2(s);mode=charging',
    text: "Vented nickel batteries gas and sealed ones may overheat or reverse when overcharged or overdischarged. Use the maker's charge control and ventilation.",
    basis: 'IEC 62485-2; IEC 60622/60623',
  },
  {
    trigger: 'mode=electrolysis|charging;condition=series-string-above-60-vdc',
    text: 'A long series of cells is an electric-shock and arc hazard that cannot be switched off at the cells. Let qualified electricians apply the local electrical code.',
    basis: 'IEC 60364; NFPA 70E; IEC 62485-1 (60 V d.c. level)',
  },
  {
    trigger: 'mode=charging|galvanic;condition=external-short',
    text: 'A low-resistance cell that is shorted can deliver enough current to melt metal and burst the case. Fuse at the terminals and insulate tools.',
    basis: 'IEC 62485-1; NFPA 70E',
  },
  {
    trigger: 'element=Cu|Ag|Zn|Ni|Cd|Hg|Pb;condition=drain-disposal',
    text: 'Heavy-metal solutions harm water life and sewage works even when dilute. Collect and hand over as the local waste and water law requires.',
    basis: 'GHS aquatic acute 1 and chronic 1; Basel Convention',
  },
  {
    trigger: 'any=Fe(C5H5)2(aq)|Fe(C10H8N2)3^2+(aq)|Fe(C12H8N2)3^2+(aq);with=ClO4^-(aq)',
    text: 'Perchlorate salts of metal complexes and ferrocenium can detonate when dry or scraped. Use another counter-ion and never isolate dry crystals in quantity.',
    basis: 'Published accident reports; GHS explosive',
  },
  {
    trigger: 'any=C6H4O2(aq)|C6H6O2(aq)',
    text: 'Quinone vapour stains and damages the eye, and hydroquinone sensitises skin. Vent and avoid contact as the SDS states.',
    basis: 'OSHA PEL 0.1 ppm quinone, 2 mg/m3 hydroquinone',
  },
  {
    trigger: 'any=SCN^-(aq);medium=acid;condition=strong-oxidant|hot',
    text: 'Thiocyanate with strong oxidants or hot acid can release hydrogen cyanide and other toxic gases. Keep dilute and ventilated, as the SDS advises.',
    basis: 'EU CLP EUH032; OSHA PEL 10 ppm for HCN',
  },
  {
    trigger: 'any=(SCN)2(aq)',
    text: 'Thiocyanogen is unstable, toxic and polymerises with heat. Handle only cold, dilute and freshly made under supervision.',
    basis: 'GHS acute toxicity; published synthesis notes',
  },
  {
    trigger: 'any=Bi2O3(s)|Sb2O5(s)|TeO2(s)|Te(s);medium=acid;mode=electrolysis',
    text: 'Tellurium and related elements can form small amounts of foul, toxic hydrides at a cathode in acid. Ventilate and keep the cathode potential above the hydride region.',
    basis: 'OSHA PEL 0.1 mg/m3 Te; ACGIH hydride limits',
  },
  {
    trigger: 'any=Ag2O(s)|AgO(s)|Ag2O3(s)',
    text: 'Higher silver oxides oxidise organics and can ignite them when dry and warm. Keep off grease and ammonia and follow the SDS.',
    basis: 'GHS oxidising solid 2',
  },
];

import type { UnitFamily } from './entry.ts';

const joule = 'kg m^2 s^-2';
const watt = 'kg m^2 s^-3';

/** Energies. The Btu without a mark is the International Table one, the calorie without a mark the thermochemical one. */
export const energy: UnitFamily = {
  field: 'energy',
  units: [
    { symbols: ['Wh', 'Whr'], names: ['watt hour', 'watt-hour'], factor: '3600', of: joule, prefixes: 'all', source: 'NIST SP 811, B.8' },
    { symbols: ['Ws'], names: ['watt second', 'watt-second'], factor: '1', of: joule, prefixes: 'all', source: 'NIST SP 811, B.8' },
    { symbols: ['cal', 'cal_th', 'calth'], names: ['calorie', 'thermochemical calorie'], factor: '4.184', of: joule, prefixes: 'all', remark: 'thermochemical; the International Table one is cal_IT', source: 'NIST SP 811, B.8' },
    { symbols: ['cal_IT', 'calIT'], names: ['international table calorie'], factor: '4.1868', of: joule, prefixes: 'all', source: 'NIST SP 811, B.8' },
    { symbols: ['cal15', 'cal_15'], names: ['15 degree calorie'], factor: '4.1858', of: joule, prefixes: 'all', uncertainty: 6e-5, source: 'NIST SP 811, B.8, calorie (15 °C) 4.185 80 J' },
    { symbols: ['Cal'], names: ['large calorie', 'food calorie', 'kilogram calorie'], factor: '4184', of: joule, prefixes: 'none', remark: 'nutrition, 1 kcal', source: 'NIST SP 811, B.8' },
    { symbols: ['thermie'], names: ['thermie'], factor: '4.1868e6', of: joule, prefixes: 'none', remark: '1 Mcal_IT', source: 'common practice' },
    { symbols: ['BTU', 'Btu', 'btu', 'BTU_IT', 'Btu_IT', 'BtuIT', 'btus', 'BTUs', 'Btus'], names: ['british thermal unit', 'international table british thermal unit'], factor: '1055.05585262', of: joule, prefixes: 'none', remark: 'International Table: 1 BTU/(lb °F) = 4186.8 J/(kg K)', source: 'NIST SP 811, B.8' },
    { symbols: ['BTU_th', 'Btu_th', 'Btuth'], names: ['thermochemical british thermal unit'], factor: '4184*0.45359237*5/9', of: joule, prefixes: 'none', remark: '1 BTU_th/(lb °F) = 4184 J/(kg K)', source: 'NIST SP 811, B.8' },
    { symbols: ['kBTU', 'kBtu', 'kbtu', 'KBTU'], names: ['thousand british thermal unit'], factor: '1055055.85262', of: joule, prefixes: 'none', source: 'common practice' },
    { symbols: ['MMBTU', 'MMBtu', 'MMbtu', 'mmBtu', 'mmBTU'], names: ['million british thermal unit'], factor: '1055055852.62', of: joule, prefixes: 'none', remark: 'MM counts millions; MBtu alone is ambiguous', source: 'common practice' },
    { symbols: ['thm', 'therm', 'therms'], names: ['therm'], factor: '105505585.262', of: joule, prefixes: 'none', remark: '100000 BTU_IT (EC); the US therm is 1.054804e8 J', source: 'NIST SP 811, B.8' },
    { symbols: ['therm_US', 'thmUS'], names: ['us therm'], factor: '105480400', of: joule, prefixes: 'none', source: 'NIST SP 811, B.8' },
    { symbols: ['quad'], names: ['quad'], factor: '1.05505585262e18', of: joule, prefixes: 'none', weak: true, source: 'NIST SP 811, B.8, note' },
    { symbols: ['erg', 'ergs'], names: ['erg'], factor: '1e-7', of: joule, prefixes: 'all', source: 'NIST SP 811, B.8' },
    { symbols: ['eV'], names: ['electronvolt', 'electron volt'], factor: '1.602176634e-19', of: joule, prefixes: 'all', source: 'SI Brochure, table 8' },
    { symbols: ['E_h', 'hartree'], names: ['hartree'], factor: '4.3597447222060e-18', of: joule, prefixes: 'none', weak: true, uncertainty: 1.1e-12, source: 'CODATA 2022' },
    { symbols: ['Ry', 'rydberg'], names: ['rydberg'], factor: '2.1798723611030e-18', of: joule, prefixes: 'none', weak: true, uncertainty: 1.1e-12, source: 'CODATA 2022' },
    { symbols: ['toe'], names: ['tonne of oil equivalent'], factor: '41868000000', of: joule, prefixes: 'large', weak: true, remark: '10 Gcal_IT', source: 'IEA and UN energy statistics' },
    { symbols: ['tce'], names: ['tonne of coal equivalent'], factor: '29307600000', of: joule, prefixes: 'large', remark: '7 Gcal_IT', source: 'UN energy statistics' },
    { symbols: ['tTNT', 'ton_TNT', 'tonTNT'], names: ['ton of tnt'], factor: '4184000000', of: joule, prefixes: 'large', source: 'NIST SP 811, B.8' },
    { symbols: ['ft-lbf', 'ftlbf', 'ft_lbf', 'ft-lb', 'ftlb', 'ft.lbf', 'lbf-ft', 'lb-ft', 'lbft'], names: ['foot pound force', 'foot pound-force', 'foot pound', 'foot-pound'], factor: '0.3048*0.45359237*9.80665', of: joule, prefixes: 'none', remark: 'the pound is a force here', source: 'NIST SP 811, B.8' },
    { symbols: ['in-lbf', 'inlbf', 'in_lbf', 'in-lb', 'inlb', 'lbf-in', 'lb-in'], names: ['inch pound force', 'inch pound-force', 'inch pound', 'inch-pound'], factor: '0.0254*0.45359237*9.80665', of: joule, prefixes: 'none', remark: 'the pound is a force here', source: 'NIST SP 811, B.8' },
    { symbols: ['in-ozf', 'ozf-in', 'oz-in', 'in-oz'], names: ['inch ounce force', 'ounce inch'], factor: '0.0254*0.45359237/16*9.80665', of: joule, prefixes: 'none', remark: 'the ounce is a force here', source: 'NIST SP 811, B.8' },
    { symbols: ['kip-ft', 'ft-kip', 'k-ft', 'kipft'], names: ['kip foot', 'foot kip'], factor: '0.3048*453.59237*9.80665', of: joule, prefixes: 'none', source: 'common practice' },
    { symbols: ['kip-in', 'in-kip', 'k-in', 'kipin'], names: ['kip inch', 'inch kip'], factor: '0.0254*453.59237*9.80665', of: joule, prefixes: 'none', source: 'common practice' },
    { symbols: ['kgf-m', 'kgfm', 'kgm_f', 'kgf.m'], names: ['kilogram force metre', 'kilogram-force metre'], factor: '9.80665', of: joule, prefixes: 'none', source: 'NIST SP 811, B.8' },
    { symbols: ['hp-h', 'hph', 'hp-hr', 'hphr'], names: ['horsepower hour', 'horsepower-hour'], factor: '550*0.3048*0.45359237*9.80665*3600', of: joule, prefixes: 'none', source: 'common practice; factor NIST SP 811, B.8' },
    { symbols: ['ton-h', 'ton-hr', 'tonh', 'ton_h', 'TRh', 'RTh'], names: ['ton hour', 'ton hour of refrigeration'], factor: '12000*1055.05585262', of: joule, prefixes: 'none', remark: 'cooling energy, 12000 BTU_IT', source: 'common practice' },
    { symbols: ['Ly'], names: [], factor: '41840', of: 'kg s^-2', prefixes: 'none', weak: true, remark: 'langley; also a length', source: 'NIST SP 811, B.8, cal_th/cm²' },
    { symbols: ['langley'], names: ['langley'], factor: '41840', of: 'kg s^-2', prefixes: 'none', remark: '1 cal_th/cm²', source: 'NIST SP 811, B.8, cal_th/cm²' },
  ],
};

export const power: UnitFamily = {
  field: 'power',
  units: [
    { symbols: ['hp', 'HP', 'Hp'], names: ['horsepower', 'mechanical horsepower'], factor: '550*0.3048*0.45359237*9.80665', of: watt, prefixes: 'none', remark: 'mechanical, 550 ft lbf/s', source: 'NIST SP 811, B.8' },
    { symbols: ['bhp', 'BHP'], names: ['brake horsepower'], factor: '550*0.3048*0.45359237*9.80665', of: watt, prefixes: 'none', weak: true, remark: 'mechanical horsepower at the shaft; the boiler horsepower is hp_boiler', source: 'common practice' },
    { symbols: ['whp', 'WHP'], names: ['water horsepower', 'hydraulic horsepower'], factor: '550*0.3048*0.45359237*9.80665', of: watt, prefixes: 'none', weak: true, remark: 'mechanical horsepower given to the water; the water horsepower of NIST SP 811 is 746.043 W', source: 'common practice' },
    { symbols: ['CV'], names: [], factor: '75*9.80665', of: watt, prefixes: 'none', weak: true, remark: 'metric horsepower; also a coefficient of variation', source: 'NIST SP 811, B.8' },
    { symbols: ['PS', 'hpM', 'hp_metric'], names: ['metric horsepower'], factor: '75*9.80665', of: watt, prefixes: 'none', source: 'NIST SP 811, B.8' },
    { symbols: ['hpE', 'hp_electric'], names: ['electric horsepower'], factor: '746', of: watt, prefixes: 'none', source: 'NIST SP 811, B.8' },
    { symbols: ['hpS', 'hp_boiler', 'BoHP'], names: ['boiler horsepower'], factor: '9809.5', of: watt, prefixes: 'none', source: 'NIST SP 811, B.8' },
    { symbols: ['TR', 'RT'], names: [], factor: '12000*1055.05585262/3600', of: watt, prefixes: 'none', weak: true, remark: 'tons of refrigeration; TR and RT stand for other things too', source: 'NIST SP 811, B.8' },
    { symbols: ['tonR', 'ton_ref', 'ton_refrigeration', 'USRT', 'ton_r'], names: ['ton of refrigeration', 'refrigeration ton', 'ton refrigeration'], factor: '12000*1055.05585262/3600', of: watt, prefixes: 'none', remark: '12000 BTU_IT/h', source: 'NIST SP 811, B.8' },
    { symbols: ['BTUH', 'Btuh', 'BTUh', 'btuh', 'BtuH'], names: ['btu per hour', 'btus per hour'], factor: '1055.05585262/3600', of: watt, prefixes: 'none', source: 'NIST SP 811, B.8' },
    { symbols: ['MBH', 'kBtuh', 'MBtuh', 'kBTUh'], names: ['thousand btu per hour'], factor: '1055055.85262/3600', of: watt, prefixes: 'none', remark: 'thousand BTU_IT/h', source: 'common practice' },
    { symbols: ['VA'], names: ['volt ampere', 'volt-ampere', 'voltampere'], factor: '1', of: watt, prefixes: 'all', remark: 'apparent power', source: 'ISO 80000-6' },
    { symbols: ['var', 'Var', 'VAR'], names: [], factor: '1', of: watt, prefixes: 'all', weak: true, remark: 'reactive power; var is also a variance or a variable', source: 'ISO 80000-6' },
    { symbols: ['VAr'], names: ['volt ampere reactive', 'volt-ampere reactive'], factor: '1', of: watt, prefixes: 'all', remark: 'reactive power', source: 'ISO 80000-6' },
    { symbols: ['Wp', 'W_p', 'Wdc', 'Wac', 'Wpk'], names: ['watt peak', 'watt-peak', 'peak watt'], factor: '1', of: watt, prefixes: 'all', remark: 'rated power of photovoltaic modules and inverters', source: 'common practice' },
    { symbols: ['We', 'W_e', 'Wel'], names: ['watt electric', 'watt electrical'], factor: '1', of: watt, prefixes: 'large', weak: true, remark: 'electric power of a plant', source: 'common practice' },
    { symbols: ['Wth', 'Wt', 'W_th'], names: ['watt thermal'], factor: '1', of: watt, prefixes: 'large', weak: true, remark: 'thermal power of a plant', source: 'common practice' },
    { symbols: ['L_sun', 'Lsun'], names: ['solar luminosity', 'nominal solar luminosity'], factor: '3.828e26', of: watt, prefixes: 'none', weak: true, source: 'IAU 2015 resolution B3' },
    { symbols: ['Jy'], names: [], factor: '1e-26', of: 'kg s^-2', prefixes: 'all', weak: true, remark: 'jansky; also a moment of inertia', source: 'IAU style manual' },
    { symbols: ['jansky'], names: ['jansky'], factor: '1e-26', of: 'kg s^-2', prefixes: 'all', source: 'IAU style manual' },
  ],
};

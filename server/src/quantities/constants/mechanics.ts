import type { ConstantEntry } from '../catalogue/entry.ts';
import { met } from './met.ts';

/**
 * Gravity, and the numbers that are one when their units are carried along: the mechanical equivalent of heat, the
 * proportionality constant of English units, runoff and shaft-power factors.
 */
export const mechanicsConstants: readonly ConstantEntry[] = [
  { name: 'standard acceleration of free fall', symbol: 'g_n', value: '9.80665', unit: 'm/s^2', uncertainty: 0,
    metAs: [...met('m/s^2', '9.8', '9.80', '9.81', '9.807', '9.8066', '9.8067', '9.80665', '9.806', '9.80616', '9.80621'), ...met('ft/s^2', '32', '32.2', '32.17', '32.174', '32.1740', '32.18', '32.174049'), ...met('in/s^2', '386', '386.1', '386.09', '386.088', '386.0886'), ...met('cm/s^2', '981', '980.665', '980.7', '980.67'), ...met('mm/s^2', '9810', '9806.65', '9807', '9806'), ...met('km/s^2', '9.80665e-3', '0.00981', '9.81e-3')], source: '3rd CGPM (1901); CODATA 2022, exact' },
  { name: 'proportionality constant of force and mass', symbol: 'g_c', value: '1', unit: '1', uncertainty: 0,
    metAs: [...met('lbm ft/(lbf s^2)', '32.2', '32.17', '32.174', '32.1740', '32', '32.174049'), ...met('lbm in/(lbf s^2)', '386', '386.1', '386.09', '386.088'), ...met('lbm/slug', '32.2', '32.17', '32.174'), ...met('lbm ft/(lbf h^2)', '4.17e8', '4.1698e8'), ...met('kg m/(kgf s^2)', '9.8', '9.81', '9.807', '9.80665'), ...met('N/kgf', '9.8', '9.81', '9.807', '9.80665'), ...met('N/lbf', '4.448', '4.4482', '4.45', '4.44822')], source: 'from the definitions of the pound-force and the kilogram-force; NIST SP 811, B.8' },
  { name: 'mechanical equivalent of heat', symbol: 'J', value: '1', unit: '1', uncertainty: 0,
    metAs: [
      ...met('ft lbf/BTU', '778', '778.2', '778.16', '778.17', '778.169'), ...met('J/cal', '4.18', '4.184', '4.19', '4.1840'), ...met('J/cal_IT', '4.187', '4.1868', '4.19', '4.186'), ...met('J/BTU', '1055', '1055.06', '1055.1', '1055.056'), ...met('kJ/BTU', '1.055', '1.05506', '1.0551', '1.0550559'),
      ...met('kgf m/kcal_IT', '427', '426.9', '426.94', '426.935'), ...met('BTU/(hp h)', '2544', '2545', '2544.4', '2544.43'), ...met('BTU/(W h)', '3.41', '3.412', '3.413', '3.4121', '3.41214'), ...met('BTU/(kW h)', '3412', '3413', '3412.14', '3412.1', '3412.142'),
      ...met('BTU/(h ton_ref)', '12000', '1.2e4'), ...met('BTU/(min ton_ref)', '200'), ...met('kW/ton_ref', '3.517', '3.5169', '3.52', '3.516', '3.51685'), ...met('kcal_IT/(kW h)', '860', '859.8', '859.845', '859.85'), ...met('kcal/(kW h)', '860', '860.4', '860.42'),
      ...met('W/hp', '745.7', '746', '745.70', '745.69987', '745.6999'), ...met('kW/hp', '0.7457', '0.746', '0.74570', '0.745699872'), ...met('W/PS', '735.5', '735.499', '736', '735.49875'), ...met('kW/PS', '0.7355', '0.7354988'),
      ...met('ft lbf/(s hp)', '550'), ...met('ft lbf/(min hp)', '33000', '33e3'), ...met('in lbf/(s hp)', '6600'), ...met('kgf m/(s PS)', '75'), ...met('BTU/(min hp)', '42.4', '42.41', '42.407'), ...met('kJ/(kW h)', '3600'), ...met('ft lbf/(s kW)', '737.56', '737.6', '738'), ...met('J/(ft lbf)', '1.356', '1.3558', '1.35582'), ...met('J/eV', '1.602e-19', '1.6e-19', '1.6022e-19', '1.602176634e-19'),
    ], source: 'from the definitions of BTU_IT, calorie and horsepower; NIST SP 811, B.8' },
  { name: 'pressure times flow as power', symbol: 'η', value: '1', unit: '1', uncertainty: 0,
    metAs: [...met('gpm psi/hp', '1714', '1714.3', '1714.29'), ...met('cfm inH2O/hp', '6343', '6343.3'), ...met('cfm psi/hp', '229', '229.2', '229.17'), ...met('L bar/(min kW)', '600'), ...met('m^3 bar/(h kW)', '36'), ...met('L kPa/(s kW)', '1000'), ...met('in^2/ft^2', '144'), ...met('in^3/gal', '231'), ...met('gal/ft^3', '7.48', '7.481', '7.4805', '7.48052'), ...met('gpm/cfs', '448.8', '448.83', '449', '448.831'), ...met('cfs/MGD', '1.547', '1.5472', '1.55'), ...met('gpm/MGD', '694.4', '694', '694.44')], source: 'from the definitions of gallon, horsepower and the conventional column of water; NIST SP 811, B.8' },
  { name: 'fan horsepower divisor', symbol: 'η', value: '6356', unit: 'cfm inH2O/hp', uncertainty: 7e-4,
    metAs: met('cfm inH2O/hp', '6356', '6354', '6350', '6360', '6362'), source: 'common practice in fan engineering: water gauge near room temperature' },
  { name: 'turns per radian in shaft power', symbol: '1/(2π)', value: '0.5/pi', unit: 'rev/rad', uncertainty: 0,
    metAs: [...met('ft lbf rpm/hp', '5252', '5252.1', '5252.11', '5250'), ...met('in lbf rpm/hp', '63025', '63025.4', '63000', '63030'), ...met('N m rpm/kW', '9549', '9549.3', '9550', '9549.297'), ...met('N m rpm/W', '9.549', '9.5493', '9.55', '9.5492966'), ...met('kgf m rpm/PS', '716.2', '716', '716.20'), ...met('kgf m rpm/kW', '973.8', '974'), ...met('rpm s/rad', '9.549', '9.5493', '9.55'), ...met('rev/rad', '0.159', '0.1592', '0.15915', '0.159155')], source: 'from 2π radians to the revolution; the numbers are common practice' },
  { name: 'rainfall rate over area as flow', symbol: 'C', value: '1', unit: '1', uncertainty: 0,
    metAs: [...met('cfs h/(acre in)', '1.008', '1.01', '1.0083'), ...met('m^3 h/(s km^2 mm)', '0.278', '0.2778', '0.27778', '0.28'), ...met('m^3 h/(s ha mm)', '0.00278', '2.78e-3', '0.002778'), ...met('ha mm s/(h m^3)', '360'), ...met('km^2 mm s/(h m^3)', '3.6'), ...met('ft^3/(mi^2 in)', '2323200'), ...met('ft^2/acre', '43560'), ...met('ft^3/(acre ft)', '43560'), ...met('cfs d/(acre ft)', '0.504', '0.5042', '0.50417'), ...met('acre ft/(cfs d)', '1.983', '1.9835', '1.98347'), ...met('cfs d/(mi^2 in)', '26.89', '26.9', '26.888'), ...met('mm km^2 s/(m^3 d)', '86.4'), ...met('s/d', '86400'), ...met('m^3/(ha mm)', '10')], source: 'from the definitions of acre, foot and hectare; the rational method of hydrology' },
  { name: 'four over π in pipe velocity', symbol: '4/π', value: '4/pi', unit: '1', uncertainty: 0,
    metAs: [...met('1', '1.27', '1.273', '1.2732', '1.27324'), ...met('ft in^2/(s gpm)', '0.408', '0.4085', '0.409', '0.4084', '0.40850'), ...met('ft in^2/(s cfs)', '183.3', '183.35', '183'), ...met('m mm^2 h/(s m^3)', '353.7', '353.68', '354', '353.678'), ...met('m mm^2 min/(s L)', '21.22', '21.2', '21.221')], source: 'from the area of a circle; the numbers are common practice' },
];

import { convert, printNumber } from '../units/index.ts';
import { Args, Base, Flags } from './base.ts';

/** `runbrief convert`: a quantity in another unit. */
export default class Convert extends Base {
  static override examples = [
    { command: 'runbrief convert "12 gal/min" L/s', description: 'a volume flow in litres per second' },
    { command: 'runbrief convert "2 bar gauge" "kPa abs"', description: 'a gauge pressure as absolute pressure' },
    { command: 'runbrief convert "50 K difference" "degF difference"', description: 'a temperature difference' },
  ];

  static override args = {
    quantity: Args.string({ required: true, description: 'a number with its unit, in quotes' }),
    unit: Args.string({ required: true, description: 'the unit wanted' }),
  };

  static override flags = { digits: Flags.integer({ default: 6, min: 1, max: 15, helpValue: 'N', description: 'significant digits shown' }) };

  async run(): Promise<object> {
    const { args, flags } = await this.parse(Convert);
    const { value, unit, half, assumed } = convert(args.quantity, args.unit);
    const number = printNumber({ value, unit: '1', digits: flags.digits });
    const spread = half === undefined ? '' : ` +/- ${printNumber({ value: half, unit: '1', digits: 3 })}`;
    this.say([`${number}${spread} ${unit}`, ...assumed.map((one) => `  assumed: ${one}`)].join('\n'));
    return { value, unit, ...(half === undefined ? {} : { half }), ...(assumed.length === 0 ? {} : { assumed }) };
  }
}

/** What a roll-end mailer may be asked. Proportions are engineering practice unless a source is named. */
import type { Asks } from "../../parameters/parameter";

const PRACTICE = "engineering practice, no published source";

export const mailerAsks: Asks = {
  rollPlay: { label: "Roll play", kind: "length", default: "max(if(micro, 0.5, 0.3), creaseSpacing - t - 2*aLeast)", atLeast: 0.2, atMost: 4, why: "three boards rolled with no slack do not go over a springy flap; two creases need room for both channels", source: "strip of 3.5 to 4 mm for E flute, common practice" },
  innerShort: { label: "Inner side, short of the base", kind: "length", default: 0.3, atLeast: 0.1, atMost: 2, why: "it must not stand on the base before the roll lies flat", source: PRACTICE },
  stripIn: { label: "Roll, set in at its ends", kind: "length", default: "a + slide", atLeast: 0.2, atMost: "W/8", why: "clears front and back", source: PRACTICE },
  ears: { label: "Locking ears", kind: "switch", default: true, why: "they hold the lid shut in the gaps of the side walls", source: "0427 is known by them; which parts a code leaves out differs by maker" },
  earSet: { label: "Inner side, set back for the ears", kind: "length", default: "2*t + 1", atLeast: "t + 0.5", atMost: "W/6", why: "the tuck passes in front of the inner wall and the ear goes in behind it", source: PRACTICE },
  tabs: { label: "Tabs a side", kind: "count", default: "if(W < 300.001, 2, 3)", atLeast: 1, atMost: 4, why: "two hold to 300 mm", source: PRACTICE },
  tabLength: { label: "Tab, length", kind: "length", default: "clamp(W/6, 12, 40)", atLeast: 8, atMost: "W/(tabs + 1)", why: "long enough to grip", source: PRACTICE },
  tabOut: { label: "Tab, beyond the inner side's edge", kind: "length", default: "t + innerShort + 0.2", atLeast: "0.8*t + innerShort", atMost: "2*t + 1", why: "through the base's board", source: PRACTICE },
  tabTaper: { label: "Tab, angle of its ends", kind: "angle", default: 5, atLeast: 0, atMost: 45, why: "leads in", source: PRACTICE },
  slotLonger: { label: "Slot, longer than the tab", kind: "length", default: 1.5, atLeast: 0.4, atMost: 4, why: "tabs and slots are cut apart from each other", source: "tab + 1 to 2 mm, common practice" },
  slotWider: { label: "Slot, wider than the board", kind: "length", default: 0.6, atLeast: 0.2, atMost: 2, why: "the tab goes in, and stays", source: "caliper + 0.5 to 1 mm, common practice" },
  cornerDeep: { label: "Corner flap", kind: "length", default: "min(0.45*W, 1.1*D)", atLeast: 8, atMost: "W/2 - 1.5*t", why: "stiffens the side and holds the roll open", source: PRACTICE, because: "the corner flaps of front and back would meet" },
  cornerDown: { label: "Corner flap, below the roll", kind: "length", default: "t + 0.5", atLeast: 0.3, atMost: "D/4", why: "clears the roll's creases", source: PRACTICE },
  cornerFoot: { label: "Corner flap, foot above the base", kind: "length", default: "a + 0.5", atLeast: "a + 0.2", atMost: "D/4", why: "the foot must not bind in the base crease", source: PRACTICE },
  cornerTaper: { label: "Corner flap, angle at the base", kind: "angle", default: 5.5, atLeast: 5, atMost: 20, why: "its cut and the side's open as a wedge of 5 degrees or more from the crease corner", source: PRACTICE },
  cornerRadius: { label: "Free corners, radius", kind: "length", default: 3, atLeast: 0, atMost: "D/3", why: "free corners catch and fray", source: "3 to 10 mm at free flap corners" },
  tuck: { label: "Tuck", kind: "length", default: "min(D - t - 2, max(min(20, D - t - 2), 0.65*D), 60)", atLeast: 8, atMost: "D - t - 1", why: "goes down behind the front", source: PRACTICE, because: "it must not reach the base" },
  tuckShort: { label: "Tuck, narrower than the inside", kind: "length", default: 2, atLeast: 0.5, atMost: "L/10", why: "without ears it goes down between the side walls", source: PRACTICE },
  tuckRadius: { label: "Tuck, corner radius", kind: "length", default: "min(8, tuck/2)", atLeast: 0, atMost: "tuck - 1", why: "finds its way in", source: "8 to 12 mm in E flute, common practice" },
  earLong: { label: "Ear, length", kind: "length", default: "clamp(0.09*W, 12, 22)", atLeast: 8, atMost: "W/4", why: "a front locking ear is 10 to 15 mm deep", source: "10 to 15 mm, common practice" },
  earHigh: { label: "Ear, height", kind: "length", default: "min(0.6*tuck, 0.45*D)", atLeast: 5, atMost: "tuck - 2", why: "stays above the front's corner flap", source: PRACTICE },
  wing: { label: "Wing", kind: "length", default: "min(0.6*D, D - t - 3)", atLeast: 5, atMost: "D - t - 2", why: "goes down inside the side walls", source: PRACTICE, because: "it must not reach the base" },
  wingRear: { label: "Wing, from the lid's back crease", kind: "length", default: 2, atLeast: 1, atMost: "W/6", why: "clears the back", source: PRACTICE },
  wingFront: { label: "Wing, from the tuck crease", kind: "length", default: "t + 3", atLeast: "t + 1", atMost: "W/4", why: "clears the tuck", source: PRACTICE },
  wingTaper: { label: "Wing, angle of its ends", kind: "angle", default: 12, atLeast: 5, atMost: 30, why: "leads in", source: PRACTICE },
};

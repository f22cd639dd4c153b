import { Notice } from '@/components/ui/notice';

/** The standing caution beside every plan of lit lamps. */
export function Caution() {
  return (
    <Notice tone="danger" role="note">
      254 nm light injures eyes and skin within seconds at these levels. Empty the room, close doors and post
      signs. Follow your local rules, the emitter’s manual and a qualified safety officer.
    </Notice>
  );
}

/** What the figures leave out, for whoever relies on them. */
export function ModelLimits() {
  return (
    <p className="text-sm text-ink-2">
      Direct light only: reflections, soil on surfaces and lamp faults are left out. UV-C adds to manual
      cleaning and does not replace it.
    </p>
  );
}

import L from 'leaflet';

const STEP_PX = 6;
const STEPS: Record<string, [number, number]> = {
  ArrowUp: [0, -STEP_PX],
  ArrowDown: [0, STEP_PX],
  ArrowLeft: [-STEP_PX, 0],
  ArrowRight: [STEP_PX, 0],
};

/** A ring about a seat that is dragged by hand, or moved by the arrow keys while it has the focus. */
export function seatHandle(map: L.Map, onMove: (at: L.LatLng) => void) {
  let marker: L.Marker | null = null;
  let dragging = false;

  function make(at: L.LatLng, label: string): L.Marker {
    const icon = L.divIcon({ className: 'm-seat', iconSize: [44, 44] });
    const made = L.marker(at, { icon, draggable: true, zIndexOffset: 1500, title: label, alt: label }).addTo(map);
    made.on('dragstart', () => {
      dragging = true;
    });
    made.on('drag', () => onMove(made.getLatLng()));
    made.on('dragend', () => {
      dragging = false;
    });
    const element = made.getElement();
    element?.setAttribute('aria-label', label);
    element?.addEventListener('keydown', (event) => {
      const step = STEPS[event.key];
      if (!step) return;
      event.preventDefault();
      event.stopPropagation();
      const next = map.layerPointToLatLng(map.latLngToLayerPoint(made.getLatLng()).add(step));
      made.setLatLng(next);
      onMove(next);
    });
    return made;
  }

  function clear(): void {
    marker?.remove();
    marker = null;
  }

  return {
    update(seat: { at: L.LatLng; label: string } | null): void {
      if (dragging) return;
      if (!seat) clear();
      else if (marker) marker.setLatLng(seat.at);
      else marker = make(seat.at, seat.label);
    },
    destroy: clear,
  };
}

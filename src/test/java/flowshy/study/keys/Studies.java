package flowshy.study.keys;

import java.util.List;

/** Studies that together write every key which this version reads. */
final class Studies {
    static final String SMALLEST = "hair: {length: 610 um, diameter: 77 um, density: 1.3 g/cm3}\nmedium: air\n";

    static final List<String> ALL =
            List.of(SMALLEST, """
            title: every key of a cylinder
            hair: {shape: cylinder, length: 0.61 mm, diameter: 77 µm, density: 1300 kg/m3, youngs-modulus: 3 GPa, foot-gap: 3 um}
            suspension:
              stiffness: 3 nN.m/rad
              damping: {value: 2e-13 N.m.s/rad, in: {name: air, temperature: 21 degC, pressure: 99 kPa, humidity: 30 %}, cover: open}
              plate-inertia: 4e-18 kg.m2
              pivot-depth: 3 um
              attitude: hanging
              readout-noise: 1 nrad/rtHz
              film: {length: 120 um, width: 80 um, gap: 3 um}
            medium: {name: air, temperature: 25 degC, pressure: 1 bar, humidity: 20 %}
            cover: {kind: sealed, fill: {name: helium, temperature: 25 degC, pressure: 1 bar}}
            band: {from: 5 Hz, to: 2 kHz}
            motion: {smallest: 0.1 m/s2 peak, full-scale: 2 g, spectrum: [[20 Hz, 0.01 g2/Hz], [2 kHz, 1e-4 g2/Hz]]}
            accept:
              rejection: 10 dB
              error: 0.2 m/s2 peak
              mass: 5 ug
              volume: {at-least: 1e-3 mm3, at-most: 0.01 mm3}
              inertia: {at-least: 1e-16 kg.m2, at-most: 1e-15 kg.m2}
              inertial-torque: 1e-12 N.m/(m/s2)
              footprint: 90 um
              length: 1 mm
              slenderness: 5
              resonance: {at-least: 200 Hz, at-most: 400 Hz}
              quality: {at-least: 0.8, at-most: 4}
              sensitivity: 0.2 mrad/(m/s2)
              flow-sensitivity: 1 mrad/(m/s)
              noise: 10 ug/rtHz
              worst-noise: 0.2 mm/s2/rtHz
              noise-rms: 1 mm/s2
              rejection-from: -3 dB
              rejection-to: 30 dB
              motion-width: 200 Hz
              motion-octaves: 3
              motion-from: 20 Hz
              motion-to: 1 kHz
              equivalent: 20 m/s2/(m/s)
              largest-speed: 1 mm/s
              offset: 0.1 m/s2
              smallest-readable: 5 mm/s2
              dynamic-range: 60 dB
              static-tilt: 1 mrad
              gravity-tilt: 1 mrad
              stream-tilt: 1 mrad
              bending-frequency: 10 kHz
              bending-ratio: 10
              bending-stiffness: 1 uN.m/rad
              bending-stiffness-ratio: 10
              tip-clearance: 100 um
            calibration: {frequency: 60 Hz, cover: open}
            tolerances: {hair.diameter: {sd: 3 %}, drag-law: off, both: {within: 2 %, keys: [hair.length, hair.density]}}
            envelope: {medium.temperature: [20 degC, 30 degC], medium: {pressure: 99 kPa..1 bar}}
            finite-length: estimate
            hold: resonance
            document: {project: p, part: "7", revision: 2.10, prepared-by: a, checked-by: b, approved-by: c, remarks: d}
            """, """
            hair: {shape: taper, length: 700 um, base-diameter: 90 um, tip-diameter: 0 um, density: 1.2 g/cm3}
            suspension:
              resonance: {frequency: 300 Hz, in: {density: 1.2 kg/m3, viscosity: 18 uPa.s, temperature: 20 degC, sound-speed: 343 m/s}, cover: {kind: sealed, diameter: 2 mm, height: 1 mm}}
              quality: {value: 1.5, in: {density: 1.2 kg/m3, kinematic-viscosity: 15 cSt}, cover: {kind: sealed, diameter: 2 mm, height: 1 mm}}
            medium: {density: 1.2 kg/m3, viscosity: 18 uPa.s, sound-speed: 343 m/s, temperature: 20 degC}
            cover: {kind: sealed, fill: {density: 0.9 g/cm3, kinematic-viscosity: 5 cSt, sound-speed: 1300 m/s}}
            """, """
            hair: {shape: club, length: 900 um, stalk-diameter: 50 um, stalk-length: 400 um, shoulder-length: 60 um,
                   head-diameter: 130 um, end: round, density: 1.2 g/cm3}
            suspension:
              resonance: 250 Hz
              ring-down: {decay-time: 5 ms, frequency: 240 Hz, in: vacuum}
            medium: {density: 1 g/cm3, kinematic-viscosity: 1 cSt}
            cover: {kind: sealed, fill: {density: 0.9 g/cm3, viscosity: 4 mPa.s}}
            """, """
            hair: {shape: profile, points: [[0 um, 90 um], [300 um, 80 um], [0.6 mm, 0 um]], density: 2.33 g/cm3}
            suspension: {stiffness: 3 nN.m/rad, quality: 20}
            medium: {name: nitrogen, second: helium, share: 20 %}
            cover: {kind: sealed, fill: {name: helium, second: argon, share: 5 %}}
            """, """
            hair: {shape: profile, file: profile.csv, density: 2.33 g/cm3}
            suspension:
              stiffness: 3 nN.m/rad
              ring-down: {file: swing.csv, in: {name: helium, second: argon, share: 1 %}}
            medium: nitrogen
            """, """
            hair: {length: 610 um, diameter: 77 um, density: 1.3 g/cm3}
            suspension:
              stiffness: 3 nN.m/rad
              ring-down: {decay-time: 1 ms, in: {name: nitrogen, temperature: 20 degC, pressure: 1 bar}, cover: {kind: sealed, diameter: 2 mm, height: 1 mm}}
            medium: nitrogen
            """, """
            hair: {length: 610 um, diameter: 77 um, density: 1.3 g/cm3}
            suspension: {resonance: {frequency: 300 Hz, in: {file: own.csv}}, quality: {value: 3, in: {file: own.csv}}}
            medium: {file: own.csv, temperature: 20 degC, pressure: 1 bar}
            cover: {kind: sealed, fill: {file: own.csv}}
            """, """
            hair: {length: 610 um, diameter: 77 um, density: 1.3 g/cm3}
            suspension: {stiffness: 3 nN.m/rad, damping: {value: 1e-12 N.m.s/rad, in: {file: own.csv}, cover: {kind: sealed, diameter: 2 mm, height: 1 mm}}}
            medium: nitrogen
            """, """
            hair: {length: 610 um, diameter: 77 um, density: 1.3 g/cm3}
            suspension: {stiffness: 3 nN.m/rad, ring-down: {decay-time: 1 ms, in: {file: own.csv}}}
            medium: nitrogen
            """, """
            hair: {length: 610 um, diameter: 77 um, density: 1.3 g/cm3}
            medium: nitrogen
            cover: {kind: roofed, gap: 1 mm, length: 5 mm}
            candidates: [open, {kind: sealed, diameter: 2 mm, height: 1 mm}]
            """, """
            hair: {length: 610 um, diameter: 77 um, density: 1.3 g/cm3}
            medium: nitrogen
            cover: {kind: vented, holes: 4, hole-diameter: 0.3 mm, hole-depth: 0.2 mm, sides: through, cavity-volume: 30 mm3, cavity-section: 9 mm2}
            """, """
            hair: {length: 610 um, diameter: 77 um, density: 1.3 g/cm3}
            medium: nitrogen
            cover: {kind: sealed, diameter: 2 mm, height: 1 mm}
            """, """
            hair: {length: 610 um, diameter: 77 um, density: 1.3 g/cm3}
            medium: nitrogen
            cover: {kind: measured, file: lid.csv}
            motion: {spectrum: {file: floor.csv, columns: [t, a], quantity: time record, unit: g, skip: 2, rate: 1 kHz, resolution: 2 Hz}}
            """, """
            hair: {length: 610 um, diameter: 77 um, density: 1.3 g/cm3}
            medium: nitrogen
            surroundings:
              air past the window: {like: ventilated room}
              draught: {kind: stream, mean-speed: 0.3 m/s, turbulence: 35 %, length-scale: 60 mm, fetch: 8 mm, direction: 20 deg}
              same again: {like: fan outlet, kind: stream, mean-speed: 2 m/s}
              duct: {kind: duct, width: 200 mm, height: 120 mm, volume-flow: 30 L/s, turbulence: 6 %, length-scale: 2 cm}
              pipe: {kind: duct, diameter: 2 in, mean-speed: 1 m/s}
              fan tone: {kind: tone, frequency: 150 Hz, speed: 4 mm/s peak, direction: -30 deg}
              hall: {kind: sound, level: 82 dB, from: 100 Hz, to: 2 kHz}
              horn: {kind: sound, levels: [[100 Hz, 71 dB], [125 Hz, 74 dB]], distance: 20 cm}
              logged: {kind: spectrum, file: a.csv, columns: [f, S], quantity: density, unit: (m/s)2/Hz, skip: 3, mean-speed: 0.2 m/s, fetch: 1 cm}
              probe: {kind: record, file: b.csv, columns: ['t [ms]', '-', u], unit: m/s, skip: 1, rate: 2 kHz, resolution: 2 Hz, distance: 1 m}
            """, """
            hair: {length: 610 um, diameter: 77 um, density: 1.3 g/cm3}
            suspension: {stiffness: 3 nN.m/rad}
            medium: nitrogen
            measurements:
              shaker run 7: {file: run7.csv, of: motion, gain: -2.5 mV/mrad}
              tunnel: {file: tunnel.csv, of: flow, gain: free, columns: [frequency, amplitude, '-'], units: [Hz, mV/(m/s), '-'], skip: 2}
              both: {file: ratio.csv, of: rejection}
            """);

    private Studies() {}
}

// The carton in the 3-D scene. Geometry is made once a carton; a turn of the lever only writes matrices.
import { useThree, type ThreeEvent } from "@react-three/fiber";
import { useEffect, useLayoutEffect, useMemo } from "react";
import { DoubleSide, Group, Matrix4, Mesh, MeshBasicMaterial, MeshLambertMaterial, OrthographicCamera, Vector3 } from "three";
import { LineMaterial } from "three/examples/jsm/lines/LineMaterial.js";
import { LineSegments2 } from "three/examples/jsm/lines/LineSegments2.js";
import { LineSegmentsGeometry } from "three/examples/jsm/lines/LineSegmentsGeometry.js";
import { poseAt, progressOf } from "~/cartons/fold/pose";
import { panelRuns } from "~/cartons/export/picture/faces";
import { transform, type Mat, type Vec3 } from "~/cartons/geometry/space";
import type { Carton } from "~/cartons/types";
import { lookAt, type Turn } from "../camera";
import type { View } from "../view";
import type { Colours } from "./colours";
import { creaseLine, outlineLines, panelGeometry } from "./panel-geometry";

interface Props {
  readonly carton: Carton;
  readonly u: number;
  readonly turn: Turn;
  readonly drawing: View;
  readonly colours: Colours;
  readonly lit: ReadonlySet<string>;
  readonly seeThrough: boolean;
  readonly onHover: (panel: string | null) => void;
}

const OUTLINE_PX = 1.5;
const CREASE_PX = 1.2;
/** px: dash and gap of a crease that is not bent yet, as on the drawing. */
const DASH = [13, 5] as const;
/** Radians: from here on a crease is drawn as the carton's edge. */
const BENT = 0.26;
/** Light from the upper left in front, as in the pictures. */
const FALL: Vec3 = [-0.55, 1, 0.7];

const matrixOf = (m: Mat): Matrix4 => new Matrix4().set(m[0], m[1], m[2], m[3], m[4], m[5], m[6], m[7], m[8], m[9], m[10], m[11], 0, 0, 0, 1);

export function FoldingCarton({ carton, u, turn, drawing, colours, lit, seeThrough, onHover }: Props) {
  const { camera, size, invalidate } = useThree();
  const paints = useMemo(() => ({
    faces: [colours.print, colours.inside, colours.core].map((color) => new MeshLambertMaterial({ color, polygonOffset: true, polygonOffsetFactor: 1, polygonOffsetUnits: 1, side: DoubleSide })),
    lit: new MeshBasicMaterial({ color: colours.lit, polygonOffset: true, polygonOffsetFactor: 1, polygonOffsetUnits: 1 }),
    glass: new MeshLambertMaterial({ color: colours.print, transparent: true, opacity: 0.12, depthWrite: false }),
    cast: new MeshBasicMaterial({ color: colours.cast, depthWrite: false }),
    line: new LineMaterial({ color: colours.ink, linewidth: OUTLINE_PX }),
    bent: new LineMaterial({ color: colours.ink, linewidth: CREASE_PX }),
    crease: new LineMaterial({ color: colours.crease, linewidth: CREASE_PX, dashed: true }),
  }), [colours]);
  useEffect(() => () => { [...paints.faces, paints.lit, paints.glass, paints.cast, paints.line, paints.bent, paints.crease].forEach((m) => m.dispose()); }, [paints]);

  const solids = useMemo(() => panelRuns(carton).map((runs, i) => {
    const panel = carton.fold.panels[i]!;
    const geometry = panelGeometry(panel);
    const mesh = new Mesh(geometry);
    mesh.name = panel.name;
    const lines = new LineSegments2(new LineSegmentsGeometry().setPositions(outlineLines(runs, panel.thickness)));
    const crease = new LineSegments2(new LineSegmentsGeometry().setPositions(creaseLine(runs, panel.thickness)));
    crease.computeLineDistances();
    crease.visible = carton.fold.hinges.some((h) => h.child === i);
    const group = new Group();
    group.add(mesh, lines, crease);
    group.matrixAutoUpdate = false;
    const shadow = new Mesh(geometry);
    shadow.matrixAutoUpdate = false;
    shadow.renderOrder = -1;
    shadow.raycast = () => {};
    return { panel, group, mesh, lines, crease, shadow, hinge: carton.fold.hinges.find((h) => h.child === i) };
  }), [carton]);
  useEffect(() => () => {
    for (const s of solids) {
      s.mesh.geometry.dispose();
      s.lines.geometry.dispose();
      s.crease.geometry.dispose();
    }
  }, [solids]);

  useLayoutEffect(() => {
    const pose = poseAt(carton.fold, u);
    const look = lookAt(carton.fold, pose, u, turn, drawing, size);
    for (const line of [paints.line, paints.bent, paints.crease]) line.resolution.set(size.width, size.height);
    paints.crease.dashSize = DASH[0] / look.scale;
    paints.crease.gapSize = DASH[1] / look.scale;
    const cast = shadowMatrix(carton, pose);
    solids.forEach(({ panel, group, mesh, lines, crease, hinge, shadow }, i) => {
      const m = pose[i]!;
      group.matrix.copy(matrixOf(m));
      group.matrixWorldNeedsUpdate = true;
      const facesViewer = -(m[2] * look.towards[0] + m[6] * look.towards[1] + m[10] * look.towards[2]) > 0.15;
      const isGlass = seeThrough && u > 0 && facesViewer;
      mesh.material = lit.has(panel.name) ? [paints.lit, paints.lit, paints.faces[2]!] : isGlass ? [paints.glass, paints.glass, paints.glass] : paints.faces;
      lines.material = paints.line;
      crease.material = hinge && Math.abs(hinge.angle) * progressOf(hinge.step, u) > BENT ? paints.bent : paints.crease;
      shadow.visible = u > 0.001;
      shadow.matrix.copy(cast).multiply(group.matrix);
      shadow.matrixWorldNeedsUpdate = true;
      shadow.material = paints.cast;
    });
    aim(camera as OrthographicCamera, look);
    invalidate();
  }, [carton, u, turn, drawing, size, solids, paints, lit, seeThrough, camera, invalidate]);

  const hover = (event: ThreeEvent<PointerEvent>) => {
    event.stopPropagation();
    onHover(event.object.name || event.object.parent?.children[0]?.name || null);
  };
  return (
    <>
      <ambientLight intensity={2.1} />
      <directionalLight position={lightPlace(carton)} intensity={1.15} />
      {solids.map(({ panel, group, shadow }) => (
        <group key={panel.name}>
          <primitive object={shadow} />
          <primitive object={group} onPointerMove={hover} onPointerOut={() => onHover(null)} />
        </group>
      ))}
    </>
  );
}

function aim(camera: OrthographicCamera, look: ReturnType<typeof lookAt>): void {
  const far = 4000;
  const [cx, cy, cz] = look.centre;
  const [tx, ty, tz] = look.towards;
  camera.matrixAutoUpdate = true;
  camera.quaternion.setFromRotationMatrix(new Matrix4().makeBasis(new Vector3(...look.right), new Vector3(...look.up), new Vector3(...look.towards)));
  camera.position.set(cx + tx * far, cy + ty * far, cz + tz * far);
  camera.near = 0.1;
  camera.far = 2 * far;
  camera.zoom = look.scale;
  camera.updateProjectionMatrix();
  camera.updateMatrixWorld();
}

const lightPlace = ({ fold }: Carton): [number, number, number] => {
  const [up, front] = [fold.up, fold.front];
  const right: Vec3 = [up[1] * front[2] - up[2] * front[1], up[2] * front[0] - up[0] * front[2], up[0] * front[1] - up[1] * front[0]];
  return [0, 1, 2].map((k) => 1000 * (FALL[0] * right[k]! + FALL[1] * up[k]! + FALL[2] * front[k]!)) as [number, number, number];
};

/** Presses the carton flat along the light onto the floor under its lowest corner. */
function shadowMatrix(carton: Carton, pose: readonly Mat[]): Matrix4 {
  const { up } = carton.fold;
  const light = lightPlace(carton);
  const floor = Math.min(...carton.fold.panels.flatMap((panel, i) => panel.outline.vertices.map((v) => {
    const [x, y, z] = transform(pose[i]!, v.x, v.y, 0);
    return x * up[0] + y * up[1] + z * up[2];
  }))) - 0.3;
  const fall = light[0] * up[0] + light[1] * up[1] + light[2] * up[2];
  const row = (k: 0 | 1 | 2) => [0, 1, 2].map((j) => (j === k ? 1 : 0) - (light[k] * up[j]!) / fall).concat((light[k] * floor) / fall) as [number, number, number, number];
  return new Matrix4().set(...row(0), ...row(1), ...row(2), 0, 0, 0, 1);
}

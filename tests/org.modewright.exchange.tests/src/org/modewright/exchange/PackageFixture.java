package org.modewright.exchange;

import java.io.IOException;
import java.io.OutputStream;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.LinkedHashMap;
import java.util.Map;
import java.util.zip.ZipEntry;
import java.util.zip.ZipOutputStream;

/** A small sound table package that tests change at one place. */
final class PackageFixture {

    private final Map<String, String> files = new LinkedHashMap<>();

    PackageFixture() {
        put("nodes.csv", "id,x,y,z\nN1,0,0,0\nN2,0,0,3\nN3,4,0,3\nN4,4,0,0\n");
        put("materials.csv", "id,young,poisson,density,shear\nsteel,210e6,0.3,7.85,\n");
        put("frame_sections.csv", "id,area,iy,iz,torsion,shear_area_y,shear_area_z\nC,0.01,1e-4,5e-5,1e-6,,0.004\n");
        put("members.csv", "id,start,end,section,material,roll,start_free,end_free,start_rigid,end_rigid,axial_only,axial_force,group\n"
                + "M1,N1,N2,C,steel,,,,,,,,columns\nM2,N2,N3,C,steel,90,,ry rz,0.1,0.2,,-12.5,beams\nM3,N4,N3,C,steel,,,,,,1,,columns\n");
        put("supports.csv", "node,ux,uy,uz,rx,ry,rz\nN1,1,1,1,1,1,1\nN4,1,1,1,0,,0\n");
        put("masses.csv", "node,ux,uy,uz,rx,ry,rz\nN2,5,5,5,,,\nN2,1,1,1,0.5,,\n");
        put("springs.csv", "id,node,to,ux,uy,uz,rx,ry,rz,group\nS1,N2,N3,100,,,,,,\nS2,N3,,,50,,,,,dampers\n");
        put("rigid_floors.csv", "floor,node\nF1,N2\nF1,N3\n");
        put("rigid_links.csv", "id,from,to,dofs\nL1,N2,N3,ux uy\n");
        put("levels.csv", "id,elevation\nfirst,3\n");
        put("gravity_loads.csv", "pattern,kind,target,value\ndead,member,M2,12\nlive,node,N3,40\n");
        put("mass_rule.csv", "pattern,factor\nself,0.5\ndead,1\nlive,0.3\n");
        describe();
    }

    /** Replaces a file. */
    PackageFixture put(String file, String content) {
        files.put(file, content);
        return this;
    }

    PackageFixture remove(String file) {
        files.remove(file);
        return this;
    }

    /** Replaces text in a file; it must be there. */
    PackageFixture replace(String file, String old, String replacement) {
        String content = files.get(file);
        if (!content.contains(old)) {
            throw new IllegalArgumentException(file + " does not hold " + old);
        }
        return put(file, content.replace(old, replacement));
    }

    /** Writes a description of the tables that are there. */
    PackageFixture describe() {
        StringBuilder resources = new StringBuilder();
        files.keySet().stream().filter(file -> file.endsWith(".csv")).forEach(file -> resources.append(resources.isEmpty() ? "" : ",\n  ")
                .append("{\"name\": \"").append(file.replace(".csv", "")).append("\", \"path\": \"").append(file).append("\"}"));
        return put("datapackage.json",
                "{\"name\": \"portal\", \"title\": \"A portal\",\n \"structure\": {\"version\": 1, \"units\": \"kN-m-t\"},\n"
                + " \"resources\": [\n  " + resources + "]}\n");
    }

    Path folder(Path folder) throws IOException {
        for (Map.Entry<String, String> file : files.entrySet()) {
            Path path = folder.resolve(file.getKey());
            Files.createDirectories(path.getParent());
            Files.writeString(path, file.getValue(), StandardCharsets.UTF_8);
        }
        return folder;
    }

    Path zip(Path zip) throws IOException {
        try (OutputStream out = Files.newOutputStream(zip); ZipOutputStream stream = new ZipOutputStream(out)) {
            for (Map.Entry<String, String> file : files.entrySet()) {
                stream.putNextEntry(new ZipEntry(file.getKey()));
                stream.write(file.getValue().getBytes(StandardCharsets.UTF_8));
                stream.closeEntry();
            }
        }
        return zip;
    }
}

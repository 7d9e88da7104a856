# Third-party works

Written by `mvn -q -Plicenses -DskipTests package`. All are in the shaded jar, unchanged except that
signatures, module descriptors and files that are never read were left out.

| work | version | license |
|---|---|---|
<#list dependencyMap as entry>
<#assign project = entry.getKey()/>
<#if project.groupId != "torqueloom">
| ${project.groupId}:${project.artifactId} | ${project.version} | ${entry.getValue()?join(" or ")} |
</#if>
</#list>

The native parts of `org.bytedeco:openblas` and `org.nd4j:nd4j-native` hold further works, as files
of their own that can be replaced:

| file | work | license |
|---|---|---|
| `libopenblas` | OpenBLAS 0.3.19 | BSD 3-Clause |
| `libgfortran`, `libgcc_s`, `libgomp` | GCC runtime libraries | GPL 3 or later with the GCC Runtime Library Exception 3.1 |
| `libquadmath` | GCC quad-precision mathematics | LGPL 2.1 or later |

#!/usr/bin/env bash
# Exercises the script torqueloom on a copy of the sources, with a stand-in for Maven that gives a
# tiny program instead of the real one: what is tested is when and how it builds and starts.
# Usage: bench/launcher-check.sh          Needs a JDK. Takes about half a minute.
set -u

root=$(cd "$(dirname "$0")/.." && pwd)
scratch=$(mktemp -d)
trap 'rm -rf "$scratch"' EXIT
copy="$scratch/a clone with spaces"
passed=0
failed=0

check() { # check WHAT COMMAND...
  local what=$1
  shift
  if "$@"; then
    passed=$((passed + 1))
  else
    failed=$((failed + 1))
    echo "FAILED: $what" >&2
    sed 's/^/    out: /' "$scratch/out" >&2
    sed 's/^/    err: /' "$scratch/err" >&2
  fi
}

# Runs a command; its code, output and messages are in $code, $scratch/out and $scratch/err.
run() {
  "$@" >"$scratch/out" 2>"$scratch/err" </dev/null
  code=$?
}

says() { [ "$(cat "$scratch/out")" = "$1" ]; }
builds() { [ "$(cat "$scratch/builds")" = "$1" ]; }
code_is() { [ "$code" -eq "$1" ]; }
tells() { grep -q -- "$1" "$scratch/err"; }
one_line() { [ "$(wc -l <"$scratch/err")" -eq 1 ]; }
jars() { find "$copy/.build" -name 'torqueloom-*.jar' | wc -l; }
jars_are() { [ "$(jars)" -eq "$1" ]; }
clean() { [ -z "$(find "$copy/.build" -name 'lock' -o -name 'work.*' -o -name 'tmp.*' -o -name 'log.*')" ]; }
has() { grep -qx -- "$1" "$scratch/out"; }
fresh() {
  rm -rf "$copy/.build"
  echo 0 >"$scratch/builds"
  rm -f "$scratch/mode"
}

# --- the stand-ins -------------------------------------------------------------------------------

mkdir -p "$scratch/bin" "$scratch/program" "$copy"
cat >"$scratch/program/Main.java" <<'JAVA'
public class Main {
  public static void main(String[] args) throws Exception {
    switch (args.length == 0 ? "" : args[0]) {
      case "environment" -> {
        for (String name : new String[] {"OMP_NUM_THREADS", "OPENBLAS_NUM_THREADS", "OPENBLAS_CORETYPE"}) {
          System.out.println(name + "=" + System.getenv(name));
        }
        System.out.println("heap=" + (Runtime.getRuntime().maxMemory() >> 20 > 300 ? "large" : "small"));
        System.out.println("folder=" + System.getProperty("user.dir"));
        System.out.println("vector=" + ModuleLayer.boot().findModule("jdk.incubator.vector").isPresent());
        System.out.println("option=" + System.getProperty("option"));
      }
      case "sleep" -> {
        System.out.println(ProcessHandle.current().pid());
        Thread.sleep(60_000);
      }
      case "exit" -> System.exit(Integer.parseInt(args[1]));
      default -> System.out.println("stand-in" + String.join("|", args));
    }
  }
}
JAVA
(cd "$scratch/program" && javac --release 17 Main.java && jar cfe program.jar Main ./*.class) || exit 1

cat >"$scratch/bin/mvn" <<'MVN'
#!/bin/sh
# Counts its calls, then does what the file "mode" says.
here=${0%/*}/..
echo $(($(cat "$here/builds") + 1)) >"$here/builds"
mode=$(cat "$here/mode" 2>/dev/null)
for argument; do
  case $argument in -Dlauncher.directory=*) work=${argument#*=} ;; esac
done
echo "a line on standard output"
case $mode in
  fail) echo "[ERROR] what went wrong"; exit 1 ;;
  slow) sleep 2 ;;
  endless) exec sleep 60 ;;
  edit) echo '// edited during the build' >>model/pom.xml; rm "$here/mode" ;;
esac
mkdir -p "$work/torqueloom-app"
cp "$here/program/program.jar" "$work/torqueloom-app/torqueloom.jar"
MVN
chmod +x "$scratch/bin/mvn"
PATH="$scratch/bin:$PATH"
unset OPENBLAS_CORETYPE OMP_NUM_THREADS OPENBLAS_NUM_THREADS TORQUELOOM_JAVA_OPTS

(cd "$root" && tar cf - torqueloom pom.xml ./*/pom.xml ./*/src/main .mvn) | (cd "$copy" && tar xf -)

# --- when it builds ------------------------------------------------------------------------------

fresh
cd /
run "$copy/torqueloom" --version
check "a fresh clone builds and runs, from another folder" says "stand-in--version"
check "and says so on standard error" tells building
check "once" builds 1
check "and cleans up" clean
run "$copy/torqueloom" --version
check "a second call does not build" builds 1
check "and says nothing" test ! -s "$scratch/err"

ln -s "$copy/torqueloom" "$scratch/absolute link"
mkdir -p "$scratch/links" && ln -s "../absolute link" "$scratch/links/relative"
run "$scratch/links/relative" 'two words' ''
check "links are followed, arguments kept apart" says "stand-intwo words|"
cd "$scratch/links" || exit 1
run sh relative --version
check "also where the shell is named" says "stand-in--version"
cd "$copy" || exit 1
run sh torqueloom --version
check "also from its own folder" says "stand-in--version"
PATH="$scratch/links:$PATH" run relative --version
check "also by PATH" says "stand-in--version"
run bash --posix "$copy/torqueloom" --version
check "also with another shell" says "stand-in--version"
check "all that without a build" builds 1

source_file=$(find model/src/main -name 'Streams.java')
echo '// a comment' >>"$source_file"
run ./torqueloom --version
check "a changed source builds" builds 2
echo 'class Added {}' >model/src/main/java/Added.java
run ./torqueloom --version
check "an added source builds" builds 3
rm model/src/main/java/Added.java "$source_file"
run ./torqueloom --version
check "a deleted source builds" builds 4
mkdir -p app/src/main/resources && echo x >app/src/main/resources/x.txt
run ./torqueloom --version
check "a resource builds" builds 5
touch app/src/main/resources/x.txt 'model/src/main/java/x.java~' model/src/main/java/.x.java.swp
mkdir -p model/src/test && echo x >model/src/test/Test.java
run ./torqueloom --version
check "new times, backup files and tests do not build" builds 5
check "of the former jars two are kept" jars_are 3

# --- several at once -----------------------------------------------------------------------------

fresh
echo slow >"$scratch/mode"
./torqueloom --version >"$scratch/first" 2>/dev/null &
run ./torqueloom --version
wait $!
check "of two at once one builds" builds 1
check "and the other waits and runs" says "stand-in--version"
check "as the first does" test "$(cat "$scratch/first")" = "stand-in--version"
check "nobody leaves a lock" clean

fresh
mkdir -p .build/lock && sh -c 'echo $$' >.build/lock/pid
run ./torqueloom --version
check "a lock whose holder died is no obstacle" says "stand-in--version"
check "and is gone" clean

fresh
echo endless >"$scratch/mode"
./torqueloom --version >"$scratch/out" 2>"$scratch/err" &
launcher=$!
until [ "$(cat "$scratch/builds")" = 1 ]; do sleep 0.1; done
kill -TERM $launcher
wait $launcher
code=$?
check "an interrupted build ends with 130" code_is 130
check "and leaves no lock and no jar" clean
check "(no jar)" jars_are 0

fresh
echo edit >"$scratch/mode"
run ./torqueloom --version
check "sources that change during a build make another" builds 2
check "and one jar" jars_are 1

fresh
run ./torqueloom --version
./torqueloom sleep >"$scratch/pid" 2>/dev/null &
launcher=$!
until [ -s "$scratch/pid" ]; do sleep 0.1; done
check "the program has the launcher's process number" test "$(cat "$scratch/pid")" = "$launcher"
for i in 1 2 3 4; do
  echo "// $i" >>model/pom.xml
  run ./torqueloom --version
  sleep 1.1
done
check "a jar in use outlives its successors" jars_are 4
kill -TERM $launcher
wait $launcher
check "a signal reaches the program" test $? -eq 143
echo "// 5" >>model/pom.xml
run ./torqueloom --version
check "and its jar is removed later" jars_are 3

# --- what goes wrong -----------------------------------------------------------------------------

fresh
echo fail >"$scratch/mode"
run ./torqueloom --version
check "a failed build ends with 3" code_is 3
check "shows its last lines" tells "what went wrong"
check "prints nothing on standard output" test ! -s "$scratch/out"
check "and leaves no lock" clean
check "(no jar)" jars_are 0

fresh
mkdir -p "$scratch/tools"
for tool in sh ls find sort tr cut uname sed mkdir mv rm cat sleep tail sha256sum head; do
  ln -sf "$(command -v $tool)" "$scratch/tools/$tool"
done
PATH="$scratch/tools" run ./torqueloom --version
check "without Java it ends with 3" code_is 3
check "in one sentence" one_line
check "that names Java" tells "no Java found"
ln -sf "$(command -v java)" "$scratch/tools/java"
PATH="$scratch/tools" run ./torqueloom --version
check "without Maven it ends with 3" code_is 3
check "and names it" tells "mvn"
rm "$scratch/tools/java"
printf '#!/bin/sh\necho "    java.specification.version = 11" >&2\n' >"$scratch/tools/java"
chmod +x "$scratch/tools/java"
PATH="$scratch/tools" run ./torqueloom --version
check "with an old Java it ends with 3" code_is 3
check "in one sentence too" one_line
check "that says which" tells "is Java 11"

# --- how it starts -------------------------------------------------------------------------------

fresh
run ./torqueloom exit 1
run ./torqueloom exit 1
check "the program's exit code is passed on" code_is 1
(cd "$scratch" && "$copy/torqueloom" environment >"$scratch/out" 2>/dev/null)
check "one OpenMP thread" has "OMP_NUM_THREADS=1"
check "one BLAS thread" has "OPENBLAS_NUM_THREADS=1"
check "heavy commands have a large heap" has "heap=large"
check "and the vector module" has "vector=true"
check "and the caller's folder" has "folder=$scratch"
OMP_NUM_THREADS=2 OPENBLAS_CORETYPE='' TORQUELOOM_JAVA_OPTS='-Xmx64m -Doption=given' run ./torqueloom environment
check "a set number of threads stays" has "OMP_NUM_THREADS=2"
check "a set kernel stays, even an empty one" has "OPENBLAS_CORETYPE="
check "the user's options win" has "heap=small"
check "and arrive" has "option=given"
OPENBLAS_CORETYPE=Zen run ./torqueloom environment
check "a set kernel stays" has "OPENBLAS_CORETYPE=Zen"

echo "launcher: $((passed + failed)) checks, $failed failed"
[ "$failed" -eq 0 ]

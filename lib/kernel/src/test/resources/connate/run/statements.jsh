var total = 0.0;
for (double v : new double[] {1, 2, 3}) { total += v; }
List.of(1, 2).forEach(v -> System.out.println(v + total));
total
var x = 1;
x = 2
x += 5;
x++
x
int count() { return ++calls; }
int calls;
count()
count()
calls
/* block
 comment with { brace */
var map = new TreeMap<String, List<Integer>>();
map.computeIfAbsent("a", k -> new ArrayList<>()).add(3);
map
var cmp = Comparator.<String>naturalOrder().reversed()
Stream.of("b", "a").sorted(cmp).toList()
true ? 1 : 2.5
char ch = 'x'
ch++
ch
byte b = 5;
b += 3
long big = 1L << 40
null
Object o = null;
o
String s;
s
final int K = 3;
K
static int st() { return 4; }
st()
public record Pub(int v) {}
new Pub(3)
@FunctionalInterface interface F { int f(int v); }
F f = v -> v * 2;
f.f(4)
abstract class Base { abstract int v(); int w() { return v() + 1; } }
class Derived extends Base { int v() { return 41; } }
new Derived().w()
class Counter { private int n; Counter up() { n++; return this; } public String toString() { return "n=" + n; } }
var counter = new Counter().up().up();
counter
var list = new ArrayList<>(List.of(3, 1, 2));
Collections.sort(list)
list
if (list.size() > 2) System.out.println("long");
else System.out.println("short");
try { Integer.parseInt("x"); }
catch (NumberFormatException e) { System.out.println("no number"); }
finally { System.out.println("done"); }
{ int local = 3; System.out.println(local); }
int a1 = 1, a2 = a1 + 1;
a2
var opt = Optional.of(3).map(v -> v + 1)
list.getClass()
var cls = list.getClass()
new int[] {1, 2}
(Runnable) () -> System.out.println("ran")
do { a1++; } while (a1 < 5);
a1
while (a1 > 0) a1--;
a1
assert a1 == 0;
synchronized (list) { list.add(9); }
list
double d = 0.1 + 0.2
float fl = 1.1f
1e-12
StrictMath.sqrt(-1)
int deep(int v) {
  Supplier<Integer> q = () ->
      10 / v;
  return q.get();
}
class Q {
  int go() {
    return deep(
       0);
  }
}
new Q()
 .go()
throw new IllegalStateException("by hand")

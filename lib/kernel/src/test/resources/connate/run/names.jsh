/// # Names that clash with the preload's, and other oddities
var m = 7;
m(3).plus(m(m))
var D = mD(3);
D
double percent = 4;
percent(percent)
var java = "a variable called java";
java.length()
var String = 5;
String
var connate = List.of(1);
connate
int show(int v) { return v + 1; }
show(2)
var $ = 1;
$ + 1
var _a = 2;
var µ = 3;
µ
var record = 4;
record + 1
var sealed = 1;
var yield_ = 2;
int[] values = {1, 2}, others[] = {{1}};
others
final class Sealed { static int count; int id = ++count; }
new Sealed().id
static <A, B> Map<A, B> pair(A a, B b) { return Map.of(a, b); }
pair("x", 2)
interface Law { double at(double x); static Law linear(double a) { return x -> a * x; } }
Law.linear(2).at(3)
var nested = new ArrayList<Map<String, ? super Integer>>();
nested.add(new HashMap<>());
nested
List<? extends Number> wild = List.of(1, 2);
wild.get(0)
var array = new List<?>[2];
array.length
var supplier = (Supplier<String>) () -> "made";
supplier.get()
int[] counter = {0};
Runnable up = () -> counter[0]++;
up.run();
up.run();
counter[0]
var total = 0;
for (var v : List.of(1, 2, 3)) total += v;
IntStream.range(0, 2).map(v -> v + total).sum()
var text = "a" + total + 'c' + 1.5f + null;
text
(total > 3) ? "more" : "less"
/* comment */ total /* inside */ + /* more */ 1 // end
if (total > 3)
{
  System.out.println("brace below");
}
else
{
  System.out.println("other");
}
Object o = total;
o instanceof Integer i && i > 2 ? i : -1
var e = assume("e", percent(5)).fraction() > 0.01 ? List.of("a") : null;
e
char c = 65;
c
short sh = (short) 70000;
sh
long l = Integer.MAX_VALUE + 1L;
l
double[] doubles = new double[] {1, 2.5, Double.NaN};
doubles
float f = 1f / 3;
f
var bits = new BitSet();
bits.set(3)
bits
var it = List.of("p", "q").iterator();
while (it.hasNext()) { System.out.print(it.next()); }
class Tree { Tree left; int v; Tree(int v) { this.v = v; } int sum() { return v + (left == null ? 0 : left.sum()); } }
var tree = new Tree(1);
tree.left = new Tree(2)
tree.sum()

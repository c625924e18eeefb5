package connate.log;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

class SvgGateTest {

  @Test
  void drawingPasses() {
    String svg =
        "<svg xmlns=\"http://www.w3.org/2000/svg\" viewBox=\"0 0 10 10\" role=\"img\">"
            + "<title>k &lt; 1 &amp; φ</title><defs><clipPath id=\"f1-c\"><rect x=\"0\" y=\"0\""
            + " width=\"9\" height=\"9\"/></clipPath></defs><g clip-path=\"url(#f1-c)\">"
            + "<path d=\"M0 0h0\" stroke=\"#000\"/><use href=\"#f1-p\"/></g></svg>";
    assertEquals(svg, SvgGate.pass(svg));
  }

  /** What a figure from a hostile engine could try; each is refused. */
  @ParameterizedTest
  @ValueSource(
      strings = {
        "<svg><script>1</script></svg>",
        "<svg><foreignObject></foreignObject></svg>",
        "<svg><image href=\"#a\"/></svg>",
        "<svg><a href=\"#x\"></a></svg>",
        "<svg><style>*{}</style></svg>",
        "<svg onload=\"x\"></svg>",
        "<svg><g style=\"fill:red\"></g></svg>",
        "<svg><g class=\"x\"></g></svg>",
        "<svg><use href=\"http://e.org/#x\"/></svg>",
        "<svg><use href=\"data:x\"/></svg>",
        "<svg><g fill=\"url(http://e.org)\"></g></svg>",
        "<svg><g fill=\"url(&#104;ttp://e.org/#a)\"></g></svg>",
        "<svg><g clip-path=\"url(#a) url(//e.org)\"></g></svg>",
        "<svg><g id='x'></g></svg>",
        "<svg><!-- c --></svg>",
        "<svg><![CDATA[x]]></svg>",
        "<svg><?php x ?></svg>",
        "<!DOCTYPE svg><svg></svg>",
        "<svg>&xxe;</svg>",
        "<svg><g></svg>",
        "<svg></svg><svg></svg>",
        "<svg></svg>tail",
        "<svg",
        "<svg xmlns=\"http://www.w3.org/1999/xhtml\"></svg>",
        "<svg xmlns:xlink=\"http://www.w3.org/1999/xlink\"></svg>",
        "<html></html>",
        "</svg>",
        "<svg><g id=\"</svg>"
      })
  void everythingElseIsRefused(String svg) {
    assertThrows(IllegalArgumentException.class, () -> SvgGate.pass(svg));
  }

  @Test
  void textInAnAttributeCannotLeaveIt() {
    String out = SvgGate.pass("<svg aria-label=\"&quot;&gt;&lt;script&gt;\"></svg>");
    assertTrue(out.contains("aria-label=\"&#34;&gt;&lt;script&gt;\""), out);
  }
}

import { inches } from "../../app/domain/units/length";
import type { Topic } from "./check";

export default {
  topic: "Inches",
  checks: [
    {
      about: "one inch is 25.4 mm",
      source: { name: "NIST SP 811", place: "appendix B", status: "from memory" },
      got: () => inches(1),
      want: 25.4,
      within: 0,
    },
  ],
} satisfies Topic;

# SPDX-License-Identifier: GPL-3.0-or-later
# Completion of trunnion-cli for bash. Installed by `cmake --install`; or source it.
_trunnion_cli() {
  local word=${COMP_WORDS[COMP_CWORD]} before=${COMP_WORDS[COMP_CWORD - 1]}
  COMPREPLY=()
  local choices
  case $before in
    --as) choices="euler quaternion matrix rotvec axis-angle" ;;
    --order | --to-order) choices="xyz xzy yxz yzx zxy zyx xyx xzx yxy yzy zxz zyz" ;;
    --about | --to-about) choices="body space" ;;
    --unit | --to-unit) choices="deg rad" ;;
    --layout) choices="wxyz xyzw" ;;
    --algebra) choices="hamilton jpl" ;;
    --direction) choices="body-to-world world-to-body" ;;
    --storage) choices="rows columns" ;;
    *)
      if [ "$COMP_CWORD" -eq 1 ]; then
        choices="read --help --version"
      elif [[ $word == -* ]]; then
        choices="--help --paste --json --as --order --about --unit --layout --algebra --direction --storage
          --to-order --to-about --to-unit"
      else
        mapfile -t COMPREPLY < <(compgen -f -- "$word")
        return
      fi
      ;;
  esac
  mapfile -t COMPREPLY < <(compgen -W "$choices" -- "$word")
}
complete -o filenames -F _trunnion_cli trunnion-cli
